import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { LookUpTable as Table } from "@/lib/schemas/shop-prices";

/** A table that the rules of a time table call by name; each entry says its source. */
export class LookUpTable extends Model<InferAttributes<LookUpTable>, InferCreationAttributes<LookUpTable>> {
  declare id: CreationOptional<string>;
  declare timeTableId: string;
  declare name: string;
  declare kind: Table["kind"];
  declare label: string;
  declare unit: string;
  declare entries: Table["entries"];
}

export function initLookUpTable(sequelize: Sequelize): void {
  LookUpTable.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      timeTableId: DataTypes.UUID,
      name: DataTypes.TEXT,
      kind: DataTypes.TEXT,
      label: DataTypes.TEXT,
      unit: DataTypes.TEXT,
      entries: DataTypes.JSONB,
    },
    { sequelize, modelName: "LookUpTable", tableName: "look_up_tables", timestamps: false },
  );
}
