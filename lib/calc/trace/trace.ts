/**
 * The working of a number, recorded by the same call that makes it. A trace is data: the screen,
 * a report and the command line are readers of the same steps.
 */

export interface FormulaSource {
  readonly document: string;
  readonly edition: string;
  readonly ref: string;
}

export interface Step {
  readonly id: string;
  readonly symbol: string;
  /** mathjs syntax; evaluated with `inputs` it gives `value`. */
  readonly expression: string;
  readonly inputs: Readonly<Record<string, number>>;
  /** For each input: the symbol of the standard and the unit. */
  readonly symbols: Readonly<Record<string, readonly [symbol: string, unit: string]>>;
  readonly value: number;
  readonly unit: string;
  readonly source: FormulaSource;
  readonly children?: readonly Step[];
}

export class Trace {
  private steps: Step[] = [];

  /** A place in the recording; steps recorded after it can become the children of a later one. */
  mark(): number {
    return this.steps.length;
  }

  /** Records a step; everything recorded since `mark` becomes its children. */
  record(step: Omit<Step, "children">, mark = this.steps.length): void {
    const children = this.steps.splice(mark);
    this.steps.push(children.length > 0 ? { ...step, children } : step);
  }

  /** The step recorded last. */
  last(): Step | undefined {
    return this.steps[this.steps.length - 1];
  }

  /** Files a step made elsewhere, so that a value computed once can be a child in several places. */
  include(step: Step | undefined): void {
    if (step) this.steps.push(step);
  }
}
