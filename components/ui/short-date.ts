/** A date and time as a register shows it, in the reader's own time zone: 1 Dec 2026, 04:52. */
export const shortDate = (iso: string): string =>
  new Date(iso).toLocaleString("en-GB", {
    day: "numeric",
    month: "short",
    year: "numeric",
    hour: "2-digit",
    minute: "2-digit",
  });
