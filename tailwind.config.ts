import type { Config } from "tailwindcss";

/**
 * Tokens only. Every colour is a variable of app/globals.css, one to one, so that the light sheet,
 * the dark sheet and forced colours share one set of names.
 */
const COLOURS = [
  "paper",
  "sheet",
  "ink",
  "soft",
  "faint",
  "rule",
  "rule2",
  "petrol",
  "petrolwash",
  "onpetrol",
  "added",
  "steel",
  "steel2",
  "web",
  "beam",
  "plate",
  "pass",
  "tight",
  "fail",
  "failwash",
] as const;

const colors: Record<string, string> = { transparent: "transparent", current: "currentColor" };
for (const name of COLOURS) colors[name] = `var(--${name})`;

const config: Config = {
  content: ["./app/**/*.tsx", "./components/**/*.tsx"],
  theme: {
    colors,
    fontFamily: { sans: ["var(--font-archivo)", "var(--font-archivo-ext)", "system-ui", "sans-serif"] },
    /* Few sizes, as on a drawing: note, label, body, lead, figure, title. */
    fontSize: {
      note: ["0.78125rem", "1.35"],
      label: ["0.8125rem", "1.35"],
      body: ["0.875rem", "1.35"],
      lead: ["1.03125rem", "1.42"],
      figure: ["1.3125rem", "1.15"],
      rank: ["1.4375rem", "1"],
      title: ["1.9375rem", "1.05"],
    },
    screens: { desk: "900px", wide: "1600px" },
  },
};

export default config;
