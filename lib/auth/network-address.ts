/**
 * The address a request came from: the entry of X-Forwarded-For that the nearest server wrote (the
 * last one; the ones before it are the sender's own claim), or "unknown", which is limited like one address.
 */
export function networkAddress(forwardedFor: string | null | undefined): string {
  const entries = (forwardedFor ?? "").split(",").map((entry) => entry.trim());
  const last = entries[entries.length - 1];
  return last === undefined || last === "" ? "unknown" : last.slice(0, 64);
}
