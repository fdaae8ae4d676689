import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A job with its nodes. */
export class Project extends Model<InferAttributes<Project>, InferCreationAttributes<Project>> {
  declare id: CreationOptional<string>;
  declare organisationId: string;
  declare name: string;
  declare description: CreationOptional<string>;
  declare version: CreationOptional<number>;
  /** Set = issued work: nobody edits it. */
  declare lockedAt: CreationOptional<Date | null>;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initProject(sequelize: Sequelize): void {
  Project.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      organisationId: DataTypes.UUID,
      name: DataTypes.TEXT,
      description: { type: DataTypes.TEXT, defaultValue: "" },
      version: { type: DataTypes.INTEGER, defaultValue: 1 },
      lockedAt: DataTypes.DATE,
      createdBy: DataTypes.UUID,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, modelName: "Project", tableName: "projects", timestamps: true },
  );
}
