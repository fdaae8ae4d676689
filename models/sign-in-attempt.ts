import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** One try to sign in: kept in the database, so that the limit survives a restart. */
export class SignInAttempt extends Model<
  InferAttributes<SignInAttempt>,
  InferCreationAttributes<SignInAttempt>
> {
  declare id: CreationOptional<string>;
  /** As typed, lower case; need not be anybody's. */
  declare email: string;
  declare address: string;
  declare succeeded: boolean;
  declare attemptedAt: Date;
}

export function initSignInAttempt(sequelize: Sequelize): void {
  SignInAttempt.init(
    {
      id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true },
      email: DataTypes.TEXT,
      address: DataTypes.TEXT,
      succeeded: DataTypes.BOOLEAN,
      attemptedAt: DataTypes.DATE,
    },
    { sequelize, modelName: "SignInAttempt", tableName: "sign_in_attempts", timestamps: false },
  );
}
