/**
 * A utilisation to two digits, as it reads in a sentence. One just over 1 must not read "1.00", since the
 * words beside it say that it fails: then a third digit is shown, and below that it is put in words.
 */
export function utilisationWords(value: number): string {
  const short = value.toFixed(2);
  if (value <= 1 || short !== "1.00") return short;
  const longer = value.toFixed(3);
  return longer === "1.000" ? "just over 1.00" : longer;
}
