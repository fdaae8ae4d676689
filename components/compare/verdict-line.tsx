import type { Verdict } from "@/lib/ranking/verdict";

const TONES = { fail: "font-[650] text-fail", pass: "font-[650] text-pass", strong: "font-[650]" } as const;

/** The comparison in a plain sentence. */
export function VerdictLine({ verdict }: { readonly verdict: Verdict }) {
  return (
    <p data-testid="verdict">
      {verdict.parts.map((part, index) =>
        part.tone ? (
          <b key={index} className={TONES[part.tone]}>
            {part.text}
          </b>
        ) : (
          <span key={index}>{part.text}</span>
        ),
      )}
    </p>
  );
}
