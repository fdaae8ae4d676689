import type { FieldError, ProblemCode } from "@/lib/schemas/problem";

/** Status of each kind of refusal; the one place where they are paired. */
export const STATUS_OF: Readonly<Record<ProblemCode, number>> = {
  sign_in_needed: 401,
  other_origin: 403,
  forbidden: 403,
  not_found: 404,
  conflict: 409,
  too_large: 413,
  invalid: 422,
  unexpected: 500,
};

interface AppErrorParts {
  readonly fields?: readonly FieldError[];
  /** Of a conflict: what stands in the database, already in the shape of the reply. */
  readonly current?: unknown;
}

/** A refusal in words for the one who asked. Anything else that is thrown is a fault and stays out of the reply. */
export class AppError extends Error {
  override readonly name = "AppError";
  readonly fields: readonly FieldError[];
  readonly current: unknown;

  constructor(
    readonly code: ProblemCode,
    message: string,
    parts: AppErrorParts = {},
  ) {
    super(message);
    this.fields = parts.fields ?? [];
    this.current = parts.current;
  }
}

export const notFound = (thing: string): AppError =>
  new AppError("not_found", `That ${thing} does not exist.`);
