import type { ReactNode } from "react";
import { Button } from "./button";
import { Notice } from "./notice";

/** Loading: words, not a spinner; said politely to a screen reader. */
export function Loading({ what }: { readonly what: string }) {
  return (
    <p role="status" className="border-l-4 border-rule2 bg-sheet px-4 py-2.5 text-soft">
      {`Loading ${what}…`}
    </p>
  );
}

/** Nothing there yet, why, and what to do about it. */
export function Empty({
  title,
  children,
  actions,
}: {
  readonly title: string;
  readonly children?: ReactNode;
  readonly actions?: ReactNode;
}) {
  return (
    <div className="border border-dashed border-rule2 bg-sheet px-6 py-8">
      <h2>{title}</h2>
      {children ? <div className="mt-2 max-w-[70ch] text-soft">{children}</div> : null}
      {actions ? <div className="mt-4 flex flex-wrap gap-2">{actions}</div> : null}
    </div>
  );
}

export interface FailedProps {
  /** What could not be done, as a sentence. */
  readonly title: string;
  readonly error: unknown;
  readonly onRetry?: (() => void) | undefined;
}

/** Failed: what, why, and a way to try again. */
export function Failed({ title, error, onRetry }: FailedProps) {
  return (
    <Notice
      tone="fail"
      role="alert"
      title={title}
      actions={onRetry ? <Button onClick={onRetry}>Try again</Button> : null}
    >
      <p>{error instanceof Error && error.message ? error.message : "No reason was given."}</p>
    </Notice>
  );
}
