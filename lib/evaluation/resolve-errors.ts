/** One thing wrong with a node document: where (dotted, `loadCases.0.left.moment`) and what, in plain words. */
export interface DocumentError {
  readonly path: string;
  readonly message: string;
}

/** Collects every fault of a document, so that a reader gets them all at once. */
export class Problems {
  private readonly found: DocumentError[] = [];

  add(path: string, message: string): void {
    this.found.push({ path, message });
  }

  /** Adds the fault and answers null, for a value that could not be made. */
  refuse(path: string, message: string): null {
    this.add(path, message);
    return null;
  }

  get count(): number {
    return this.found.length;
  }

  get isEmpty(): boolean {
    return this.found.length === 0;
  }

  list(): readonly DocumentError[] {
    return [...this.found];
  }
}

/** A length for a message: at most one decimal, no trailing zero. */
export const shownMm = (lengthMm: number): string => String(Math.round(lengthMm * 10) / 10);
