import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { ComparisonSummary } from "@/lib/schemas/comparison";
import type { ResultDocument } from "@/lib/schemas/result-document";

/** One calculation of a node with everything it was made from. Never changed afterwards. */
export class Comparison extends Model<InferAttributes<Comparison>, InferCreationAttributes<Comparison>> {
  declare id: CreationOptional<string>;
  declare nodeId: string;
  declare nodeVersion: number;
  declare engine: string;
  /** Names the rate book version and time table that priced it. */
  declare pricesKey: string;
  /** Fingerprint of the catalogue it was sized from. */
  declare catalogKey: string;
  /** What the register shows of it, so that a list of nodes need not read every result. */
  declare summary: ComparisonSummary;
  /** Without the steps of the working. */
  declare result: ResultDocument;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
}

export function initComparison(sequelize: Sequelize): void {
  Comparison.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      nodeId: DataTypes.UUID,
      nodeVersion: DataTypes.INTEGER,
      engine: DataTypes.TEXT,
      pricesKey: DataTypes.TEXT,
      catalogKey: DataTypes.TEXT,
      summary: DataTypes.JSONB,
      result: DataTypes.JSONB,
      createdBy: DataTypes.UUID,
      createdAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
    },
    { sequelize, modelName: "Comparison", tableName: "comparisons", timestamps: false },
  );
}
