import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A rolled I-section of the catalogue. Lengths mm. */
export class Section extends Model<InferAttributes<Section>, InferCreationAttributes<Section>> {
  declare id: CreationOptional<number>;
  declare designation: string;
  /** One of SECTION_FAMILIES. */
  declare family: string;
  declare depthMm: number;
  declare widthMm: number;
  declare webThicknessMm: number;
  declare flangeThicknessMm: number;
  declare rootRadiusMm: number;
  declare massKgPerM: number;
  declare source: string;
}

export function initSection(sequelize: Sequelize): void {
  Section.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      designation: DataTypes.TEXT,
      family: DataTypes.TEXT,
      depthMm: DataTypes.DOUBLE,
      widthMm: DataTypes.DOUBLE,
      webThicknessMm: DataTypes.DOUBLE,
      flangeThicknessMm: DataTypes.DOUBLE,
      rootRadiusMm: DataTypes.DOUBLE,
      massKgPerM: DataTypes.DOUBLE,
      source: DataTypes.TEXT,
    },
    { sequelize, modelName: "Section", tableName: "sections", timestamps: false },
  );
}
