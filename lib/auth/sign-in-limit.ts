import type { RecentFailures } from "@/lib/db/repositories/sign-in-attempts";

/** How many failed tries in a row are let through, by e-mail and by network address, in the window. */
export const SIGN_IN_LIMIT = { perEmail: 5, perAddress: 30, windowMinutes: 15 } as const;

/** True when a try may still be answered. */
export const mayTry = (failures: RecentFailures): boolean =>
  failures.ofEmail <= SIGN_IN_LIMIT.perEmail && failures.ofAddress <= SIGN_IN_LIMIT.perAddress;
