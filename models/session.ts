import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** One sign-in. The cookie carries only its id, so that it can be ended here. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare id: CreationOptional<string>;
  declare personId: string;
  declare createdAt: CreationOptional<Date>;
  declare lastSeenAt: Date;
  declare expiresAt: Date;
  declare revokedAt: CreationOptional<Date | null>;
}

export function initSession(sequelize: Sequelize): void {
  Session.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      personId: DataTypes.UUID,
      createdAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
      lastSeenAt: DataTypes.DATE,
      expiresAt: DataTypes.DATE,
      revokedAt: DataTypes.DATE,
    },
    { sequelize, modelName: "Session", tableName: "sessions", timestamps: false },
  );
}
