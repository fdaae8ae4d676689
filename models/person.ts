import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { Role } from "@/lib/policies/roles";

/** Somebody who signs in. */
export class Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  declare id: CreationOptional<string>;
  declare organisationId: string;
  /** Lower case. */
  declare email: string;
  declare name: string;
  declare role: Role;
  declare passwordHash: string;
  /** Set = may no longer sign in; the row stays, because other rows name it. */
  declare deactivatedAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initPerson(sequelize: Sequelize): void {
  Person.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      organisationId: DataTypes.UUID,
      email: DataTypes.TEXT,
      name: DataTypes.TEXT,
      role: DataTypes.TEXT,
      passwordHash: DataTypes.TEXT,
      deactivatedAt: DataTypes.DATE,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, modelName: "Person", tableName: "people", timestamps: true },
  );
}
