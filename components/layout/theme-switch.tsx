"use client";
import { useState } from "react";
import { THEME_COOKIE, THEMES, themeFrom, type Theme } from "./theme";

const LABELS: Record<Theme, string> = { system: "As the system", light: "Light", dark: "Dark" };
const YEAR_IN_SECONDS = 31_536_000;

function apply(theme: Theme) {
  if (theme === "system") delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
  document.cookie = `${THEME_COOKIE}=${theme}; path=/; max-age=${YEAR_IN_SECONDS}; samesite=lax`;
}

/** Light, dark or as the system; kept in this browser. */
export function ThemeSwitch({ initial }: { readonly initial: Theme }) {
  const [theme, setTheme] = useState(initial);
  return (
    <label className="inline-flex items-baseline gap-2 text-soft">
      Sheet
      <select
        value={theme}
        onChange={(event) => {
          const next = themeFrom(event.target.value);
          setTheme(next);
          apply(next);
        }}
        className="border border-transparent border-b-rule2 bg-transparent py-0.5 text-ink hover:border-rule2"
      >
        {THEMES.map((key) => (
          <option key={key} value={key} className="bg-sheet text-ink">
            {LABELS[key]}
          </option>
        ))}
      </select>
    </label>
  );
}
