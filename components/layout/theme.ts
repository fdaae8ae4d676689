/** The reader's choice of sheet. "system" follows the operating system and leaves no mark on the page. */
export const THEMES = ["system", "light", "dark"] as const;
export type Theme = (typeof THEMES)[number];

/** Kept in the browser as a cookie, so that the server can draw the first paint in the chosen theme. */
export const THEME_COOKIE = "panelwright-theme";

/** Reads a stored value; anything unknown means "system". */
export const themeFrom = (stored: string | undefined): Theme =>
  THEMES.find((theme) => theme === stored) ?? "system";
