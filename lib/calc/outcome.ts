/** A rule does not apply here: the option is answered "outside scope" with this reason, never with a number. */
export class OutsideScope extends Error {
  override readonly name = "OutsideScope";
  constructor(
    readonly reason: string,
    readonly formulaId?: string,
  ) {
    super(reason);
  }
}

/** A formula did not give a finite number: a fault of this program, not of the user's input. */
export class NotANumber extends Error {
  override readonly name = "NotANumber";
  constructor(
    readonly formulaId: string,
    readonly inputs: readonly string[],
  ) {
    super(`${formulaId} gave no finite number (not finite: ${inputs.join(", ") || "none of the inputs"})`);
  }
}
