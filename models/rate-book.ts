import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A version of a shop's money table: currency per hour, kilogram, metre or piece. Issued ones never change. */
export class RateBook extends Model<InferAttributes<RateBook>, InferCreationAttributes<RateBook>> {
  declare id: CreationOptional<string>;
  /** Without one: what everybody starts with. */
  declare organisationId: string | null;
  declare label: string;
  declare version: CreationOptional<number>;
  declare state: CreationOptional<"draft" | "issued">;
  /** ISO date. */
  declare validFrom: string;
  declare issuedAt: CreationOptional<Date | null>;
  declare issuedBy: CreationOptional<string | null>;
  declare basedOnId: CreationOptional<string | null>;
  declare currency: string;
  declare minorDigits: number;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initRateBook(sequelize: Sequelize): void {
  RateBook.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      organisationId: DataTypes.UUID,
      label: DataTypes.TEXT,
      version: { type: DataTypes.INTEGER, defaultValue: 1 },
      state: { type: DataTypes.TEXT, defaultValue: "draft" },
      validFrom: DataTypes.DATEONLY,
      issuedAt: DataTypes.DATE,
      issuedBy: DataTypes.UUID,
      basedOnId: DataTypes.UUID,
      currency: DataTypes.TEXT,
      minorDigits: DataTypes.SMALLINT,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, modelName: "RateBook", tableName: "rate_books", timestamps: true },
  );
}
