import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A property class of bolts and bars. N/mm2. */
export class FastenerGrade extends Model<
  InferAttributes<FastenerGrade>,
  InferCreationAttributes<FastenerGrade>
> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare yieldMpa: number;
  declare ultimateMpa: number;
  declare alphaV: number;
  declare source: string;
}

export function initFastenerGrade(sequelize: Sequelize): void {
  FastenerGrade.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      name: DataTypes.TEXT,
      yieldMpa: DataTypes.DOUBLE,
      ultimateMpa: DataTypes.DOUBLE,
      alphaV: DataTypes.DOUBLE,
      source: DataTypes.TEXT,
    },
    { sequelize, modelName: "FastenerGrade", tableName: "fastener_grades", timestamps: false },
  );
}
