/** Numbers as they are shown: grouped by a narrow space, a real minus sign, never rounded across a limit. */

/** A thin space that does not break. */
const GROUP = "\u202f";
const MINUS = "\u2212";

/**
 * A number with a fixed count of decimals, thousands grouped from 10 000 up.
 *
 * @param decimals - digits after the point.
 */
export function formatNumber(value: number, decimals = 0): string {
  const [whole = "0", rest] = Math.abs(value).toFixed(decimals).split(".");
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, GROUP) : whole;
  const text = rest === undefined ? grouped : `${grouped}.${rest}`;
  return value < 0 && Number(value.toFixed(decimals)) !== 0 ? MINUS + text : text;
}

/** Three significant figures at least, as a hand calculation is written: 0.0123, 1.42, 35.6, 841, 71 400. */
export function formatFigures(value: number, figures = 4): string {
  if (value === 0) return "0";
  const size = Math.floor(Math.log10(Math.abs(value)));
  if (size >= 7 || size < -5) {
    const [mantissa = "0", exponent = "0"] = Math.abs(value)
      .toExponential(figures - 1)
      .split("e");
    const power = Number(exponent);
    return `${value < 0 ? MINUS : ""}${mantissa} × 10^${power < 0 ? MINUS : ""}${Math.abs(power)}`;
  }
  const decimals = Math.max(0, figures - 1 - size);
  const fixed = formatNumber(value, Math.min(decimals, 8));
  return fixed.includes(".") ? fixed.replace(/0+$/, "").replace(/\.$/, "") : fixed;
}

/**
 * A utilisation. One that is over the limit never reads as the limit: a third digit shows, and then "just over".
 *
 * @param limit - the target utilisation.
 */
export function formatUtilisation(value: number, limit = 1): string {
  if (value <= limit || value.toFixed(2) !== limit.toFixed(2)) return value.toFixed(2);
  return value.toFixed(3) === limit.toFixed(3) ? `>${limit.toFixed(2)}` : value.toFixed(3);
}

/** Minutes as hours and minutes, as a shop writes them: 98 is 1 h 38. */
export function formatMinutes(minutes: number): string {
  const whole = Math.round(Math.abs(minutes));
  const sign = minutes < 0 && whole > 0 ? MINUS : "";
  return `${sign}${Math.floor(whole / 60)} h ${String(whole % 60).padStart(2, "0")}`;
}

/** Money: whole units from 20 up, else with hundredths; no currency. */
export const formatMoney = (amount: number): string =>
  amount === 0 ? "0" : formatNumber(amount, Math.abs(amount) >= 20 ? 0 : 2);

/** Money as a part among parts: whole units, so that a column of them can be compared at a glance. */
export const formatWholeMoney = (amount: number): string =>
  amount !== 0 && Math.abs(amount) < 0.5 ? `${amount < 0 ? MINUS : ""}<1` : formatNumber(amount, 0);

/** ISO 4217 "XXX" is no currency: money is shown as an index, the cheapest option that costs anything = 100. */
export const moneyUnit = (currency: string): string => (currency === "XXX" ? "index" : currency);
