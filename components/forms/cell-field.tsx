"use client";

import { useId, type ReactNode } from "react";
import { joinClasses } from "@/components/ui/join-classes";

export interface CellBinding {
  readonly id: string;
  readonly "aria-label": string;
  readonly "aria-invalid": true | undefined;
  readonly "aria-describedby": string | undefined;
  readonly "data-path": string;
}

export interface CellFieldProps {
  /** The whole name of the field, unit included: it stands in a grid whose heads are seen, so it is only spoken. */
  readonly label: string;
  /** Path in the node document; a message that stands elsewhere finds the field by it. */
  readonly path: string;
  readonly error?: string | undefined;
  /** Id of the help text of the row. */
  readonly hintId?: string | undefined;
  readonly className?: string;
  readonly children: (binding: CellBinding) => ReactNode;
}

/** One field of a grid: control, and its error beside it. */
export function CellField({ label, path, error, hintId, className, children }: CellFieldProps) {
  const id = useId();
  const described = [hintId, error === undefined ? undefined : `${id}-error`].filter(Boolean).join(" ");
  return (
    <div className={joinClasses("min-w-0", className)}>
      {children({
        id,
        "aria-label": label,
        "aria-invalid": error === undefined ? undefined : true,
        "aria-describedby": described === "" ? undefined : described,
        "data-path": path,
      })}
      {error === undefined ? null : (
        <p id={`${id}-error`} role="alert" className="mt-0.5 text-note font-semibold text-fail">
          <span aria-hidden="true">▲ </span>
          {error}
        </p>
      )}
    </div>
  );
}

/** A value that may be looked at only. */
export const ReadValue = ({
  label,
  path,
  children,
}: {
  readonly label: string;
  readonly path: string;
  readonly children: ReactNode;
}) => (
  <p data-path={path} className="py-1">
    <span className="sr-only">{`${label}: `}</span>
    {children}
  </p>
);
