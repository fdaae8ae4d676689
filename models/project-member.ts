import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** Who sees a project; a member may come from another organisation. */
export class ProjectMember extends Model<
  InferAttributes<ProjectMember>,
  InferCreationAttributes<ProjectMember>
> {
  declare projectId: string;
  declare personId: string;
  declare addedBy: string;
  declare createdAt: CreationOptional<Date>;
}

export function initProjectMember(sequelize: Sequelize): void {
  ProjectMember.init(
    {
      projectId: { type: DataTypes.UUID, primaryKey: true },
      personId: { type: DataTypes.UUID, primaryKey: true },
      addedBy: DataTypes.UUID,
      createdAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
    },
    { sequelize, modelName: "ProjectMember", tableName: "project_members", timestamps: false },
  );
}
