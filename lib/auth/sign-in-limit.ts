/** How many failed tries in a row are let through, by e-mail and by network address, in the window. */
export const SIGN_IN_LIMIT = { perEmail: 5, perAddress: 30, windowMinutes: 15 } as const;

export interface RecentFailures {
  /** Failures for this e-mail since its last success, this try included. */
  readonly ofEmail: number;
  /** Failures from this address, this try included. */
  readonly ofAddress: number;
}

/** True when a try may still be answered. */
export const mayTry = (failures: RecentFailures): boolean =>
  failures.ofEmail <= SIGN_IN_LIMIT.perEmail && failures.ofAddress <= SIGN_IN_LIMIT.perAddress;
