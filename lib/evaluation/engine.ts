/**
 * Names the calculation in every result. Raise it whenever a change of lib/ could change a number, so that
 * stored comparisons know that they are older.
 */
export const ENGINE = "panelwright 0.2.0";
