import type { ReactNode } from "react";
import { joinClasses } from "./join-classes";

export type NoticeTone = "plain" | "tight" | "fail" | "pass";
const TONES: Record<NoticeTone, { readonly mark: string; readonly edge: string; readonly text: string }> = {
  plain: { mark: "", edge: "border-petrol", text: "text-petrol" },
  tight: { mark: "◆", edge: "border-tight", text: "text-tight" },
  fail: { mark: "▲", edge: "border-fail", text: "text-fail" },
  pass: { mark: "●", edge: "border-pass", text: "text-pass" },
};

export interface NoticeProps {
  readonly tone?: NoticeTone;
  readonly title?: ReactNode;
  /** "alert" interrupts a screen reader, "status" waits, left out says nothing by itself. */
  readonly role?: "alert" | "status";
  readonly actions?: ReactNode;
  readonly children?: ReactNode;
  readonly className?: string;
}

/** A message on the sheet: a mark and words first, colour last. */
export function Notice({ tone = "plain", title, role, actions, children, className }: NoticeProps) {
  const look = TONES[tone];
  return (
    <div
      role={role}
      className={joinClasses(
        "flex flex-wrap items-start justify-between gap-x-6 gap-y-2 border-l-4 bg-sheet px-4 py-2.5",
        look.edge,
        className,
      )}
    >
      <div className="max-w-[75ch]">
        {title ? (
          <p className={joinClasses("font-semibold", look.text)}>
            {look.mark ? <span aria-hidden="true">{look.mark} </span> : null}
            {title}
          </p>
        ) : null}
        {children}
      </div>
      {actions ? <div className="flex gap-2">{actions}</div> : null}
    </div>
  );
}
