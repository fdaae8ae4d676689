import { useId } from "react";
import { formatUtilisation } from "@/components/ui/format-number";
import { joinClasses } from "@/components/ui/join-classes";

export type Standing = "within" | "tight" | "over";

/** Share of the limit from which a utilisation counts as tight. Common practice, no source. */
const TIGHT_SHARE = 0.95;
/** Where the bar ends, as a multiple of the limit. */
const BAR_END = 1.4;

/** How a utilisation stands against the limit. */
export const standingOf = (value: number, limit: number): Standing =>
  value > limit ? "over" : value >= TIGHT_SHARE * limit ? "tight" : "within";

export const STANDING_WORDS: Readonly<Record<Standing, string>> = {
  within: "within the limit",
  tight: "tight",
  over: "over the limit",
};
const MARKS: Readonly<Record<Standing, string>> = { within: "", tight: "◆ ", over: "▲ " };
const TONES: Readonly<Record<Standing, string>> = {
  within: "",
  tight: "text-tight font-semibold",
  over: "text-fail font-bold",
};

/** A utilisation as a figure with its mark; the words are there for those who do not see the mark. */
export function UtilisationFigure({
  value,
  limit,
  className,
}: {
  readonly value: number;
  readonly limit: number;
  readonly className?: string;
}) {
  const standing = standingOf(value, limit);
  return (
    <span className={joinClasses("whitespace-nowrap", TONES[standing], className)}>
      {MARKS[standing] ? <span aria-hidden="true">{MARKS[standing]}</span> : null}
      {formatUtilisation(value, limit)}{" "}
      {standing === "within" ? null : <span className="sr-only">{STANDING_WORDS[standing]}</span>}
    </span>
  );
}

/** A utilisation as a bar with the limit marked on it. Widths are attributes, not styles, so the page's content policy holds. */
export function UtilisationBar({ value, limit }: { readonly value: number; readonly limit: number }) {
  const id = useId().replace(/[^A-Za-z0-9]/g, "");
  const standing = standingOf(value, limit);
  const width = `${Math.min(100, Math.max(0, (value / (BAR_END * limit)) * 100)).toFixed(1)}%`;
  const limitAt = `${(100 / BAR_END).toFixed(1)}%`;
  return (
    <svg aria-hidden="true" width="100%" height="14" className="block min-w-0 flex-1">
      {standing === "over" ? (
        <defs>
          <pattern
            id={`over${id}`}
            width="4.2"
            height="4.2"
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(45)"
          >
            <rect width="3" height="4.2" fill="var(--fail)" />
          </pattern>
        </defs>
      ) : null}
      <rect x="0" y="11" width="100%" height="1" fill="var(--rule2)" />
      <rect
        x="0"
        y="5"
        width={width}
        height="6"
        fill={
          standing === "over" ? `url(#over${id})` : standing === "tight" ? "var(--tight)" : "var(--steel)"
        }
      />
      <svg x={limitAt} width="5" height="14" overflow="visible">
        <rect x="-2.5" y="1" width="5" height="13" fill="var(--cell, var(--sheet))" />
        <rect x="-1" y="1" width="2" height="13" fill="var(--ink)" />
      </svg>
    </svg>
  );
}
