"use client";

import { pathWords } from "./path-words";

/** The field of a path, or of the nearest group around it that has one. */
function fieldOf(path: string): HTMLElement | null {
  for (let at = path; at !== ""; at = at.includes(".") ? at.slice(0, at.lastIndexOf(".")) : "") {
    const field = document.querySelector<HTMLElement>(`[data-path="${at}"], [data-path^="${at}."]`);
    if (field) return field;
  }
  return null;
}

/** Puts the focus into the field of a path; the browser brings it into sight below the line that stays there. */
export const focusField = (path: string): void => fieldOf(path)?.focus();

/** Puts the focus into a choice and lists what there is to choose, where the browser can. */
export function openChoice(path: string): void {
  const field = fieldOf(path);
  field?.focus();
  if (field instanceof HTMLSelectElement && typeof field.showPicker === "function") field.showPicker();
}

/** How many faults are listed before the rest are only counted. */
const SHOWN = 6;

/** Every field that is not in order, as a way to it: a fault may stand far down the sheet. */
export function FaultsList({ errors }: { readonly errors: ReadonlyMap<string, string> }) {
  if (errors.size === 0) return null;
  const list = [...errors].slice(0, SHOWN);
  return (
    <div className="border-l-4 border-fail bg-sheet px-4 py-2.5" data-testid="faults">
      <p className="font-semibold text-fail">
        <span aria-hidden="true">▲ </span>
        {errors.size === 1 ? "One field is not in order." : `${errors.size} fields are not in order.`}
      </p>
      <ul className="mt-1 text-label">
        {list.map(([path, message]) => (
          <li key={path}>
            <button type="button" onClick={() => focusField(path)} className="text-left hover:underline">
              <span className="font-semibold">{pathWords(path)}</span>
              {`: ${message}`}
            </button>
          </li>
        ))}
      </ul>
      {errors.size > SHOWN ? (
        <p className="text-note text-soft">{`and ${errors.size - SHOWN} more`}</p>
      ) : null}
    </div>
  );
}
