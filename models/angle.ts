import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A rolled angle of the catalogue. Lengths mm. */
export class Angle extends Model<InferAttributes<Angle>, InferCreationAttributes<Angle>> {
  declare id: CreationOptional<number>;
  declare designation: string;
  declare legAMm: number;
  declare legBMm: number;
  declare thicknessMm: number;
  declare rootRadiusMm: number;
  declare toeRadiusMm: number;
  declare source: string;
}

export function initAngle(sequelize: Sequelize): void {
  Angle.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      designation: DataTypes.TEXT,
      legAMm: DataTypes.DOUBLE,
      legBMm: DataTypes.DOUBLE,
      thicknessMm: DataTypes.DOUBLE,
      rootRadiusMm: DataTypes.DOUBLE,
      toeRadiusMm: DataTypes.DOUBLE,
      source: DataTypes.TEXT,
    },
    { sequelize, modelName: "Angle", tableName: "angles", timestamps: false },
  );
}
