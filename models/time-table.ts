import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A version of a shop's minutes: its rules, constants and look-up tables. Issued ones never change. */
export class TimeTable extends Model<InferAttributes<TimeTable>, InferCreationAttributes<TimeTable>> {
  declare id: CreationOptional<string>;
  /** Without one: what everybody starts with. */
  declare organisationId: string | null;
  declare label: string;
  declare version: CreationOptional<number>;
  declare state: CreationOptional<"draft" | "issued">;
  /** ISO date. */
  declare validFrom: string;
  declare issuedAt: CreationOptional<Date | null>;
  declare issuedBy: CreationOptional<string | null>;
  declare basedOnId: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initTimeTable(sequelize: Sequelize): void {
  TimeTable.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      organisationId: DataTypes.UUID,
      label: DataTypes.TEXT,
      version: { type: DataTypes.INTEGER, defaultValue: 1 },
      state: { type: DataTypes.TEXT, defaultValue: "draft" },
      validFrom: DataTypes.DATEONLY,
      issuedAt: DataTypes.DATE,
      issuedBy: DataTypes.UUID,
      basedOnId: DataTypes.UUID,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, modelName: "TimeTable", tableName: "time_tables", timestamps: true },
  );
}
