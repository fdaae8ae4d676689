import { Fragment } from "react";

const GREEK: Readonly<Record<string, string>> = {
  alpha: "α",
  beta: "β",
  gamma: "γ",
  epsilon: "ε",
  lambda: "λ",
  mu: "μ",
  eta: "η",
  rho: "ρ",
  chi: "χ",
  omega: "ω",
  psi: "ψ",
  sigma: "σ",
  tau: "τ",
  pi: "π",
  delta: "δ",
  phi: "φ",
};

/** A symbol of the standard split into its letter and what stands below the line: "M_j,Rd" is M and j,Rd. */
export function splitSymbol(symbol: string): { readonly base: string; readonly below: string | null } {
  const at = symbol.indexOf("_");
  const base = at < 0 ? symbol : symbol.slice(0, at);
  return { base: GREEK[base] ?? base, below: at < 0 ? null : symbol.slice(at + 1) };
}

/** The factors of a symbol that is a product, such as "b_eff t_wc"; one that only carries words is left whole. */
export function factorsOf(symbol: string): readonly string[] {
  const factors = symbol.split(" ");
  return factors.every((factor) => factor.includes("_")) ? factors : [symbol];
}

/** One letter, with whatever stands over it: set in italics, as symbols are. */
export const isLetter = (base: string): boolean => /^\p{L}\p{M}*$/u.test(base);

/** Where a formula comes from, as it is cited. An edition is a year, or words where there is none. */
export const sourceText = (source: { readonly document: string; readonly edition: string }): string =>
  /^\d/.test(source.edition)
    ? `${source.document}:${source.edition}`
    : `${source.document}, ${source.edition}`;

/** A symbol in running text, with its index below the line. */
export function SymbolText({ symbol }: { readonly symbol: string }) {
  return (
    <span>
      {factorsOf(symbol).map((factor, index) => {
        const { base, below } = splitSymbol(factor);
        return (
          <Fragment key={index}>
            {index > 0 ? " " : null}
            {isLetter(base) ? <i>{base}</i> : base}
            {below === null ? null : <sub className="text-[0.78em]">{below}</sub>}
          </Fragment>
        );
      })}
    </span>
  );
}

const UNITS: Readonly<Record<string, string>> = {
  "1": "",
  "N/mm2": "N/mm²",
  m2: "m²",
  mm2: "mm²",
  mm3: "mm³",
  mm4: "mm⁴",
  "1/mm": "1/mm",
};

/** A unit as it is printed; a plain number has none. */
export const unitText = (unit: string): string => UNITS[unit] ?? unit;
