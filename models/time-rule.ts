import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { RuleFormula, RuleFormulas, RuleUse, TimeRule as Rule } from "@/lib/schemas/shop-prices";

/** One operation of a time table: when it applies, who does it, and its minutes as expressions. */
export class TimeRule extends Model<InferAttributes<TimeRule>, InferCreationAttributes<TimeRule>> {
  declare id: CreationOptional<string>;
  declare timeTableId: string;
  declare key: string;
  /** Rules are applied in this order. */
  declare position: number;
  declare operation: string;
  declare driver: Rule["driver"];
  declare category: Rule["category"];
  declare trade: string | null;
  declare workCentre: string | null;
  declare place: Rule["where"];
  declare crew: number;
  declare quantity: Rule["quantity"];
  declare runMinutes: RuleFormulas | null;
  declare setUpMinutes: RuleFormula | null;
  declare machineMinutes: RuleFormula | null;
  declare gives: string | null;
  declare uses: readonly RuleUse[];
}

export function initTimeRule(sequelize: Sequelize): void {
  TimeRule.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      timeTableId: DataTypes.UUID,
      key: DataTypes.TEXT,
      position: DataTypes.INTEGER,
      operation: DataTypes.TEXT,
      driver: DataTypes.TEXT,
      category: DataTypes.TEXT,
      trade: DataTypes.TEXT,
      workCentre: DataTypes.TEXT,
      place: DataTypes.TEXT,
      crew: DataTypes.DOUBLE,
      quantity: DataTypes.JSONB,
      runMinutes: DataTypes.JSONB,
      setUpMinutes: DataTypes.JSONB,
      machineMinutes: DataTypes.JSONB,
      gives: DataTypes.TEXT,
      uses: DataTypes.JSONB,
    },
    { sequelize, modelName: "TimeRule", tableName: "time_rules", timestamps: false },
  );
}
