import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** Strengths of a steel grade over a range of thickness. N/mm2 and mm. */
export class Steel extends Model<InferAttributes<Steel>, InferCreationAttributes<Steel>> {
  declare id: CreationOptional<number>;
  declare standard: string;
  declare grade: string;
  /** Which table of strengths the line belongs to. */
  declare strengthTable: string;
  declare overMm: number;
  declare upToMm: number;
  declare yieldMpa: number;
  declare ultimateMpa: number;
  declare source: string;
}

export function initSteel(sequelize: Sequelize): void {
  Steel.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      standard: DataTypes.TEXT,
      grade: DataTypes.TEXT,
      strengthTable: DataTypes.TEXT,
      overMm: DataTypes.DOUBLE,
      upToMm: DataTypes.DOUBLE,
      yieldMpa: DataTypes.DOUBLE,
      ultimateMpa: DataTypes.DOUBLE,
      source: DataTypes.TEXT,
    },
    { sequelize, modelName: "Steel", tableName: "steels", timestamps: false },
  );
}
