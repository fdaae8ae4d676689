import { UniqueConstraintError } from "sequelize";

/** True for the database's refusal of a second row with the same key. */
export const isUniqueBreach = (error: unknown): boolean => error instanceof UniqueConstraintError;
