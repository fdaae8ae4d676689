import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { ProductName } from "@/lib/schemas/shop-prices";

/** Embodied carbon of one product, kg CO2e per kg. */
export class CarbonFactor extends Model<
  InferAttributes<CarbonFactor>,
  InferCreationAttributes<CarbonFactor>
> {
  declare id: CreationOptional<string>;
  declare carbonTableId: string;
  declare product: ProductName;
  declare kgCo2ePerKg: string;
  declare source: string;
}

export function initCarbonFactor(sequelize: Sequelize): void {
  CarbonFactor.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      carbonTableId: DataTypes.UUID,
      product: DataTypes.TEXT,
      kgCo2ePerKg: { type: DataTypes.DECIMAL(10, 4), field: "kg_co2e_per_kg" },
      source: DataTypes.TEXT,
    },
    { sequelize, modelName: "CarbonFactor", tableName: "carbon_factors", timestamps: false },
  );
}
