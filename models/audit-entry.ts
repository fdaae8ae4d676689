import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** What was done, by whom and when. Added to, never changed: the database refuses it. */
export class AuditEntry extends Model<InferAttributes<AuditEntry>, InferCreationAttributes<AuditEntry>> {
  declare id: CreationOptional<string>;
  declare at: CreationOptional<Date>;
  /** Null = the program itself, or nobody known. */
  declare actorId: CreationOptional<string | null>;
  declare organisationId: string;
  declare projectId: CreationOptional<string | null>;
  declare action: string;
  declare subjectId: string;
  declare detail: CreationOptional<Record<string, unknown>>;
}

export function initAuditEntry(sequelize: Sequelize): void {
  AuditEntry.init(
    {
      id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
      at: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
      actorId: DataTypes.UUID,
      organisationId: DataTypes.UUID,
      projectId: DataTypes.UUID,
      action: DataTypes.TEXT,
      subjectId: DataTypes.TEXT,
      detail: { type: DataTypes.JSONB, defaultValue: {} },
    },
    { sequelize, modelName: "AuditEntry", tableName: "audit_entries", timestamps: false },
  );
}
