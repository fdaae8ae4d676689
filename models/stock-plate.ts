import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A plate thickness a shop keeps, mm; without an organisation it is on the list that everybody starts with. */
export class StockPlate extends Model<InferAttributes<StockPlate>, InferCreationAttributes<StockPlate>> {
  declare id: CreationOptional<number>;
  declare organisationId: string | null;
  declare thicknessMm: number;
  declare source: string;
}

export function initStockPlate(sequelize: Sequelize): void {
  StockPlate.init(
    {
      id: { type: DataTypes.INTEGER, primaryKey: true, autoIncrement: true },
      organisationId: DataTypes.UUID,
      thicknessMm: DataTypes.DOUBLE,
      source: DataTypes.TEXT,
    },
    { sequelize, modelName: "StockPlate", tableName: "stock_plates", timestamps: false },
  );
}
