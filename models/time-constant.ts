import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A number or a word that the rules of a time table refer to by name. */
export class TimeConstant extends Model<
  InferAttributes<TimeConstant>,
  InferCreationAttributes<TimeConstant>
> {
  declare id: CreationOptional<string>;
  declare timeTableId: string;
  declare name: string;
  /** Exactly one of the two values is there. */
  declare numberValue: number | null;
  declare textValue: string | null;
  declare label: string;
  declare unit: string;
  declare source: string;
}

export function initTimeConstant(sequelize: Sequelize): void {
  TimeConstant.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      timeTableId: DataTypes.UUID,
      name: DataTypes.TEXT,
      numberValue: DataTypes.DOUBLE,
      textValue: DataTypes.TEXT,
      label: DataTypes.TEXT,
      unit: DataTypes.TEXT,
      source: DataTypes.TEXT,
    },
    { sequelize, modelName: "TimeConstant", tableName: "time_constants", timestamps: false },
  );
}
