"use client";

import { createContext, useContext, useId, type ReactNode } from "react";
import { joinClasses } from "@/components/ui/join-classes";

/** Columns of a form grid: one value a row, or left and right side by side. */
export type GridColumns = 1 | 2;

/** One set of columns for every section, so that fields stand under each other down the whole sheet. */
const WIDTHS = "grid grid-cols-[minmax(7rem,1fr)_minmax(0,10rem)_minmax(0,10rem)] gap-x-3";
const Columns = createContext<GridColumns>(1);

export interface FormSectionProps {
  readonly title: string;
  readonly columns?: GridColumns;
  /** Heads of the two columns, with what may be done to a side. */
  readonly heads?: readonly [ReactNode, ReactNode];
  readonly note?: ReactNode;
  readonly children: ReactNode;
}

/** One ruled block of the sheet: its title on the rule, rows below. */
export function FormSection({ title, columns = 1, heads, note, children }: FormSectionProps) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="border-t border-ink pt-2 pb-4">
      <div className={joinClasses(WIDTHS, "items-end")}>
        <h2 id={id} className={joinClasses("text-body! font-[650]", heads ? null : "col-span-3")}>
          {title}
        </h2>
        {heads?.map((head, index) => (
          <div key={index}>{head}</div>
        ))}
      </div>
      {note ? <p className="mt-1 max-w-[62ch] text-note text-soft">{note}</p> : null}
      <Columns.Provider value={columns}>
        <div className="mt-1">{children}</div>
      </Columns.Provider>
    </section>
  );
}

/** A group of rows under a word of its own, inside a section. */
export const RowGroup = ({ title, children }: { readonly title: string; readonly children: ReactNode }) => (
  <div role="group" aria-label={title}>
    <p className="border-t border-rule2 pt-2 pb-0.5 text-note font-[650]">{title}</p>
    {children}
  </div>
);

export interface FormRowProps {
  readonly label: ReactNode;
  readonly unit?: string;
  readonly hint?: string;
  /** The field takes the room of the help text as well. */
  readonly isWide?: boolean;
  /** Gets the id of the help text, to be named by the fields. */
  readonly children: (hintId: string | undefined) => ReactNode;
}

/** One row: what it is with its unit, and a field for each column. Help stands in the free column, or under the label. */
export function FormRow({ label, unit, hint, isWide = false, children }: FormRowProps) {
  const columns = useContext(Columns);
  const id = useId();
  const hintId = hint ? id : undefined;
  const isHintBeside = columns === 1 && !isWide;
  const help = hint ? (
    <span id={id} className="block py-1 text-note leading-tight text-soft">
      {hint}
    </span>
  ) : null;
  return (
    <div className={joinClasses(WIDTHS, "items-start border-t border-rule py-[3px]")}>
      <div className="py-1">
        <span aria-hidden="true">
          {label}
          {unit ? <span className="text-note text-soft">{` ${unit}`}</span> : null}
        </span>
        {isHintBeside ? null : help}
      </div>
      {columns === 1 && isWide ? <div className="col-span-2">{children(hintId)}</div> : children(hintId)}
      {isHintBeside ? help : null}
    </div>
  );
}
