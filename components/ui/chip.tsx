import type { ReactNode } from "react";
import { joinClasses } from "./join-classes";

const TONES = {
  plain: "text-soft",
  pass: "text-pass",
  tight: "text-tight",
  fail: "text-fail",
  petrol: "text-petrol",
} as const;

/** A short word in a ruled box. */
export function Chip({
  tone = "plain",
  children,
}: {
  readonly tone?: keyof typeof TONES;
  readonly children: ReactNode;
}) {
  return (
    <span
      className={joinClasses(
        "inline-block border border-current px-1.5 text-note font-semibold",
        TONES[tone],
      )}
    >
      {children}
    </span>
  );
}
