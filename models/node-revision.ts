import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { NodeDocument } from "@/lib/schemas/node-document";

/** Every document that was ever saved for a node. */
export class NodeRevision extends Model<
  InferAttributes<NodeRevision>,
  InferCreationAttributes<NodeRevision>
> {
  declare nodeId: string;
  declare version: number;
  declare document: NodeDocument;
  declare savedBy: string;
  declare savedAt: Date;
}

export function initNodeRevision(sequelize: Sequelize): void {
  NodeRevision.init(
    {
      nodeId: { type: DataTypes.UUID, primaryKey: true },
      version: { type: DataTypes.INTEGER, primaryKey: true },
      document: DataTypes.JSONB,
      savedBy: DataTypes.UUID,
      savedAt: DataTypes.DATE,
    },
    { sequelize, modelName: "NodeRevision", tableName: "node_revisions", timestamps: false },
  );
}
