import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { NodeDocument } from "@/lib/schemas/node-document";

/** One beam-to-column node: the document as it was last saved. */
export class Node extends Model<InferAttributes<Node>, InferCreationAttributes<Node>> {
  declare id: CreationOptional<string>;
  declare projectId: string;
  /** The mark; equals document.reference. */
  declare reference: string;
  declare document: NodeDocument;
  /** Counts the saves; a save names the version it started from. */
  declare version: number;
  declare savedBy: string;
  declare savedAt: Date;
  declare createdAt: CreationOptional<Date>;
  /** Set = taken off the register; its revisions stay. */
  declare deletedAt: CreationOptional<Date | null>;
}

export function initNode(sequelize: Sequelize): void {
  Node.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      projectId: DataTypes.UUID,
      reference: DataTypes.TEXT,
      document: DataTypes.JSONB,
      version: DataTypes.INTEGER,
      savedBy: DataTypes.UUID,
      savedAt: DataTypes.DATE,
      createdAt: { type: DataTypes.DATE, defaultValue: DataTypes.NOW },
      deletedAt: DataTypes.DATE,
    },
    { sequelize, modelName: "Node", tableName: "nodes", timestamps: false },
  );
}
