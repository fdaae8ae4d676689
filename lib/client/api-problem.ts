import { type FieldError, Problem, type ProblemCode } from "@/lib/schemas/problem";

/** A refusal of the API, or no answer at all (`code` "unreachable"). `message` may be shown as it is. */
export class ApiProblem extends Error {
  override readonly name = "ApiProblem";

  constructor(
    readonly status: number,
    readonly code: ProblemCode | "unreachable",
    message: string,
    readonly fields: readonly FieldError[] = [],
    readonly requestId: string | null = null,
    /** Of a conflict: what stands in the database, to be read with the schema of the route. */
    readonly current: unknown = undefined,
  ) {
    super(message);
  }

  /** Faults of a node document with their paths inside the document, as the form knows them. */
  documentFields(): FieldError[] {
    return this.fields
      .filter((field) => field.path === "document" || field.path.startsWith("document."))
      .map((field) => ({ path: field.path.replace(/^document\.?/, ""), message: field.message }));
  }

  /** The message for one field, or null. */
  messageFor(path: string): string | null {
    return this.fields.find((field) => field.path === path)?.message ?? null;
  }
}

/** Reads a refusal; whatever is not in the shape of a problem becomes an unexpected one. */
export function problemFrom(status: number, body: unknown): ApiProblem {
  const parsed = Problem.safeParse(body);
  if (!parsed.success) {
    return new ApiProblem(
      status,
      "unexpected",
      "The server gave an answer that this page cannot read. Try again.",
    );
  }
  const { code, message, fields, requestId, current } = parsed.data.error;
  return new ApiProblem(status, code, message, fields, requestId, current);
}
