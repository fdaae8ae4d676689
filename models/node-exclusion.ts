import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** An option that a designer has set aside on a node. */
export class NodeExclusion extends Model<
  InferAttributes<NodeExclusion>,
  InferCreationAttributes<NodeExclusion>
> {
  declare nodeId: string;
  declare optionKey: string;
  declare excludedBy: string;
  declare createdAt: CreationOptional<Date>;
}

export function initNodeExclusion(sequelize: Sequelize): void {
  NodeExclusion.init(
    {
      nodeId: { type: DataTypes.UUID, primaryKey: true },
      optionKey: { type: DataTypes.TEXT, primaryKey: true },
      excludedBy: DataTypes.UUID,
      createdAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
    },
    { sequelize, modelName: "NodeExclusion", tableName: "node_exclusions", timestamps: false },
  );
}
