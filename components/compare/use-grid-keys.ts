"use client";
import { useEffect, type FocusEvent, type KeyboardEvent, type RefObject } from "react";

/** Marks what arrow keys stop at; the number is the column, 0 = the heads of the rows. */
export const stopProps = (column: number) => ({ "data-stop": column, tabIndex: -1 }) as const;

const stopsIn = (row: Element): HTMLElement[] => [...row.querySelectorAll<HTMLElement>("[data-stop]")];

function nearestStop(row: readonly HTMLElement[], column: number): HTMLElement | undefined {
  return [...row].sort(
    (a, b) => Math.abs(Number(a.dataset.stop) - column) - Math.abs(Number(b.dataset.stop) - column),
  )[0];
}

function targetOf(
  rows: readonly (readonly HTMLElement[])[],
  from: HTMLElement,
  event: KeyboardEvent,
): HTMLElement | undefined {
  const rowAt = rows.findIndex((row) => row.includes(from));
  const row = rows[rowAt] ?? [];
  const at = row.indexOf(from);
  const toEnd = event.ctrlKey || event.metaKey;
  switch (event.key) {
    case "ArrowRight":
      return row[at + 1];
    case "ArrowLeft":
      return row[at - 1];
    case "ArrowDown":
      return nearestStop(rows[rowAt + 1] ?? [], Number(from.dataset.stop));
    case "ArrowUp":
      return nearestStop(rows[rowAt - 1] ?? [], Number(from.dataset.stop));
    case "Home":
      return (toEnd ? rows[0] : row)?.[0];
    case "End":
      return (toEnd ? rows[rows.length - 1] : row)?.at(-1);
    default:
      return undefined;
  }
}

/**
 * Arrow keys in a table: one Tab stop for the whole of it, arrows move between cells, Home and End to
 * the ends of a row (with Ctrl of the table), Enter presses what stands in the cell.
 */
export function useGridKeys(table: RefObject<HTMLTableElement | null>) {
  // The cells come and go with folding, so after each drawing exactly one of them must be reachable by Tab.
  useEffect(() => {
    const stops = table.current ? stopsIn(table.current) : [];
    if (!stops.some((stop) => stop.tabIndex === 0)) stops[0]?.setAttribute("tabindex", "0");
  });

  const onFocus = (event: FocusEvent<HTMLTableElement>) => {
    const stop = (event.target as HTMLElement).closest<HTMLElement>("[data-stop]");
    if (!stop) return;
    for (const other of stopsIn(event.currentTarget))
      other.setAttribute("tabindex", other === stop ? "0" : "-1");
  };
  const onKeyDown = (event: KeyboardEvent<HTMLTableElement>) => {
    const from = (event.target as HTMLElement).closest<HTMLElement>("[data-stop]");
    if (!from || event.altKey) return;
    const rows = [...event.currentTarget.querySelectorAll("tr")].map(stopsIn).filter((row) => row.length > 0);
    const target = targetOf(rows, from, event);
    if (!target) return;
    event.preventDefault();
    target.focus();
  };
  return { onFocus, onKeyDown };
}
