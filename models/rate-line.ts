import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { RateUnit } from "@/lib/schemas/shop-prices";

/** One rate of a rate book. PostgreSQL's numeric(14,6) arrives as text, so that no digit is lost. */
export class RateLine extends Model<InferAttributes<RateLine>, InferCreationAttributes<RateLine>> {
  declare id: CreationOptional<string>;
  declare rateBookId: string;
  declare item: string;
  declare unit: RateUnit;
  declare low: string;
  declare likely: string;
  declare high: string;
  declare source: string;
}

export function initRateLine(sequelize: Sequelize): void {
  RateLine.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      rateBookId: DataTypes.UUID,
      item: DataTypes.TEXT,
      unit: DataTypes.TEXT,
      low: DataTypes.DECIMAL(14, 6),
      likely: DataTypes.DECIMAL(14, 6),
      high: DataTypes.DECIMAL(14, 6),
      source: DataTypes.TEXT,
    },
    { sequelize, modelName: "RateLine", tableName: "rate_lines", timestamps: false },
  );
}
