import type { ComponentProps, ReactNode } from "react";
import { joinClasses } from "./join-classes";

/** A ruled table that scrolls sideways inside its own frame, never widening the page; the frame takes focus so that keys can scroll it. */
export function Table({
  label,
  className,
  children,
  ...rest
}: { readonly label: string } & ComponentProps<"table">) {
  return (
    <div
      role="region"
      aria-label={label}
      tabIndex={0}
      className="relative overflow-x-auto border border-ink bg-sheet contain-inline-size"
    >
      <table {...rest} aria-label={label} className={joinClasses("w-full border-collapse", className)}>
        {children}
      </table>
    </div>
  );
}

/** A column head. */
export function Th({ className, scope = "col", ...rest }: ComponentProps<"th">) {
  return (
    <th
      {...rest}
      scope={scope}
      className={joinClasses(
        "border-b border-ink bg-paper px-3 py-2 text-left align-bottom text-label font-semibold",
        className,
      )}
    />
  );
}

/** A cell. */
export function Td({ className, ...rest }: ComponentProps<"td">) {
  return <td {...rest} className={joinClasses("border-t border-rule px-3 py-1.5 align-top", className)} />;
}

export type SortDirection = "ascending" | "descending";

export interface SortableThProps {
  readonly direction: SortDirection | null;
  readonly onSort: () => void;
  readonly className?: string;
  readonly children: ReactNode;
}

/** A column head that sorts; the arrow is drawn, and the direction told in aria-sort. */
export function SortableTh({ direction, onSort, className, children }: SortableThProps) {
  return (
    <Th aria-sort={direction ?? "none"} {...(className ? { className } : {})}>
      <button type="button" onClick={onSort} className="[text-align:inherit] font-semibold hover:underline">
        {children}
        {/* A no-break space: the arrow stays with the last word. */}
        <span aria-hidden="true" className={direction ? "text-petrol" : "text-faint"}>
          {"\u00a0"}
          {direction === "descending" ? "▾" : "▴"}
        </span>
      </button>
    </Th>
  );
}
