import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A key that a person gave to a program. The key itself is shown once and not kept. */
export class AccessToken extends Model<InferAttributes<AccessToken>, InferCreationAttributes<AccessToken>> {
  declare id: CreationOptional<string>;
  declare personId: string;
  declare name: string;
  /** First characters, to tell one from another. */
  declare hint: string;
  /** SHA-256 of the key, hexadecimal. */
  declare digest: string;
  declare createdAt: Date;
  declare lastUsedAt: CreationOptional<Date | null>;
  declare expiresAt: Date;
  declare revokedAt: CreationOptional<Date | null>;
}

export function initAccessToken(sequelize: Sequelize): void {
  AccessToken.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      personId: DataTypes.UUID,
      name: DataTypes.TEXT,
      hint: DataTypes.TEXT,
      digest: DataTypes.TEXT,
      createdAt: DataTypes.DATE,
      lastUsedAt: DataTypes.DATE,
      expiresAt: DataTypes.DATE,
      revokedAt: DataTypes.DATE,
    },
    { sequelize, modelName: "AccessToken", tableName: "access_tokens", timestamps: false },
  );
}
