/** Joins class names, leaving out what is false or missing. */
export const joinClasses = (...names: readonly (string | false | null | undefined)[]): string =>
  names.filter(Boolean).join(" ");
