import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A bolt size with its nut and washer; the preloaded assembly where EN 14399 has one. Lengths mm. */
export class Fastener extends Model<InferAttributes<Fastener>, InferCreationAttributes<Fastener>> {
  declare id: CreationOptional<number>;
  declare size: string;
  declare diameterMm: number;
  declare pitchMm: number;
  declare stressAreaMm2: number;
  declare holeMm: number;
  declare acrossFlatsMm: number;
  declare acrossPointsMm: number;
  declare headHeightMm: number;
  declare nutHeightMm: number;
  declare washerDiameterMm: number;
  declare washerThicknessMm: number;
  declare preloadedAcrossFlatsMm: number | null;
  declare preloadedAcrossPointsMm: number | null;
  declare preloadedNutHeightMm: number | null;
  declare preloadedNutHeightHvMm: number | null;
  declare preloadedWasherDiameterMm: number | null;
  declare preloadedWasherThicknessMm: number | null;
  declare source: string;
}

export function initFastener(sequelize: Sequelize): void {
  Fastener.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      size: DataTypes.TEXT,
      diameterMm: DataTypes.DOUBLE,
      pitchMm: DataTypes.DOUBLE,
      stressAreaMm2: DataTypes.DOUBLE,
      holeMm: DataTypes.DOUBLE,
      acrossFlatsMm: DataTypes.DOUBLE,
      acrossPointsMm: DataTypes.DOUBLE,
      headHeightMm: DataTypes.DOUBLE,
      nutHeightMm: DataTypes.DOUBLE,
      washerDiameterMm: DataTypes.DOUBLE,
      washerThicknessMm: DataTypes.DOUBLE,
      preloadedAcrossFlatsMm: DataTypes.DOUBLE,
      preloadedAcrossPointsMm: DataTypes.DOUBLE,
      preloadedNutHeightMm: DataTypes.DOUBLE,
      preloadedNutHeightHvMm: DataTypes.DOUBLE,
      preloadedWasherDiameterMm: DataTypes.DOUBLE,
      preloadedWasherThicknessMm: DataTypes.DOUBLE,
      source: DataTypes.TEXT,
    },
    { sequelize, modelName: "Fastener", tableName: "fasteners", timestamps: false },
  );
}
