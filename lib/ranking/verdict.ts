import type { EvaluatedOptionDocument, OptionDocument, ResultDocument } from "@/lib/schemas/result-document";
import { componentOnSide } from "./component-words";
import { utilisationWords } from "./utilisation-words";

export interface VerdictPart {
  readonly text: string;
  /** How the words are to stand out; left out = plain. */
  readonly tone?: "fail" | "pass" | "strong";
}

export interface Verdict {
  readonly text: string;
  readonly parts: readonly VerdictPart[];
}

type Evaluated = EvaluatedOptionDocument;
type Component = Evaluated["components"][number];
type Governing = Evaluated["governing"] & { readonly what?: string };

const isEvaluated = (option: OptionDocument): option is Evaluated => !("outsideScope" in option);
const isBare = (option: OptionDocument): boolean => option.measures.length === 0;

/** A space that does not break, so that a number and its unit stay on one line. */
const NBSP = "\u00a0";

/** Money in whole units from 20 up, else to the hundredth: 318 EUR, 4.20 EUR. */
function money(amount: number, currency: string): string {
  const digits = Math.abs(amount) >= 20 ? 0 : 2;
  const [whole = "0", rest] = Math.abs(amount).toFixed(digits).split(".");
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, NBSP);
  return `${amount < 0 ? "−" : ""}${grouped}${rest === undefined ? "" : `.${rest}`}${NBSP}${currency}`;
}

function hours(minutes: number): string {
  const whole = Math.round(minutes);
  const left = whole % 60;
  if (whole < 60) return `${whole}${NBSP}min`;
  return left === 0
    ? `${Math.floor(whole / 60)}${NBSP}h`
    : `${Math.floor(whole / 60)}${NBSP}h ${String(left).padStart(2, "0")}${NBSP}min`;
}

/**
 * What the verdict names as governing. A rule of detailing that is met just so, as a throat of 3 mm against 3 mm,
 * says nothing of how hard the joint works: then the most used of the other components is named.
 */
function governingCheck(option: Evaluated, target: number): Governing {
  const { governing } = option;
  if (governing.component !== "detailing") return governing;
  const isBroken = governing.utilisation > target;
  const worst = option.components
    .filter(({ component }) => (component === "detailing") === isBroken && component !== "joint-moment")
    .reduce<Component | null>((a, b) => (a === null || b.utilisation > a.utilisation ? b : a), null);
  if (worst === null) return governing;
  const { component, side, loadCase, utilisation, what } = worst;
  return { component, side, loadCase, utilisation, ...(what === undefined ? {} : { what }) };
}

/** "web compression on the right reaches 1.31 in ULS 3"; `verb` is "reaches" or "is highest at". */
function governingWords(option: Evaluated, target: number, verb: string): string {
  const { component, side, loadCase, utilisation, what } = governingCheck(option, target);
  if (component === "detailing")
    return `detailing on the ${side} is not in order${what === undefined ? "" : ` (${what})`}`;
  return `${componentOnSide(component, side)} ${verb} ${utilisationWords(utilisation)} in ${loadCase}`;
}

/** The joint furthest from the stiffness asked for. */
function stiffnessWords(option: Evaluated, target: number | "any" | "rigid"): string {
  const asked = target === "rigid" ? "rigid" : `the ${money(Number(target), "kNm/rad")} asked for`;
  const softest = [...option.joints].sort((a, b) => a.initialStiffness - b.initialStiffness)[0];
  if (softest === undefined) return `it is not stiff enough for ${asked}`;
  const reached = money(softest.initialStiffness, "kNm/rad");
  return target === "rigid"
    ? `it is not rigid, the ${softest.side} joint reaches ${reached} in ${softest.loadCase}`
    : `the ${softest.side} joint reaches ${reached} of ${asked} in ${softest.loadCase}`;
}

const isOverUtilised = (option: Evaluated, target: number): boolean => option.governing.utilisation > target;

/** Why an evaluated option does not pass. */
function failureWords(option: Evaluated, result: ResultDocument): string {
  const { utilisation, stiffness } = result.node.target;
  if (isOverUtilised(option, utilisation)) {
    const words = governingWords(option, utilisation, "reaches");
    // A target other than 1 explains why 0.93 fails.
    return utilisation === 1 ? words : `${words}, above the target of ${utilisation.toFixed(2)}`;
  }
  if (!option.stiffnessReached) return stiffnessWords(option, stiffness);
  return governingWords(option, utilisation, "reaches");
}

const endSentence = (words: string): string =>
  /[.!?]$/.test(words.trim()) ? words.trim() : `${words.trim()}.`;
const lowerFirst = (words: string): string =>
  /^[A-Z][a-z]/.test(words) ? words.charAt(0).toLowerCase() + words.slice(1) : words;

function bareParts(result: ResultDocument): readonly VerdictPart[] {
  const bare = result.options.find(isBare);
  if (bare === undefined) return [];
  if (!isEvaluated(bare)) {
    return [
      { text: "The bare column is " },
      { text: "outside the method", tone: "strong" },
      { text: `: ${endSentence(lowerFirst(bare.outsideScope.reason))} ` },
    ];
  }
  if (bare.passes) {
    return [
      { text: "The bare column is " },
      { text: "good enough", tone: "pass" },
      { text: `: ${governingWords(bare, result.node.target.utilisation, "is highest at")}. ` },
    ];
  }
  return [
    { text: "The bare column " },
    { text: "fails", tone: "fail" },
    { text: `: ${failureWords(bare, result)}. ` },
  ];
}

/** The connection's own failure, where it holds back every option that was evaluated. */
function connectionFailureOf(result: ResultDocument): string | null {
  const evaluated = result.options.filter(isEvaluated);
  if (evaluated.length === 0 || evaluated.some((option) => option.connectionFailure === null)) return null;
  const named = evaluated.find(isBare) ?? evaluated[0];
  return named?.connectionFailure ?? null;
}

function connectionParts(failure: string): readonly VerdictPart[] {
  return [
    { text: "The connection itself " },
    { text: "fails", tone: "fail" },
    {
      text: `: ${endSentence(lowerFirst(failure))} No stiffening of the column cures that; change the connection first.`,
    },
  ];
}

function nothingPassesParts(result: ResultDocument): readonly VerdictPart[] {
  const evaluated = result.options.filter((option) => isEvaluated(option) && option.notRanked !== "excluded");
  const best = evaluated
    .filter(isEvaluated)
    .sort((a, b) => a.governing.utilisation - b.governing.utilisation)[0];
  if (best === undefined) {
    return [
      { text: "No option", tone: "strong" },
      { text: " can be judged: each is outside the method or set aside." },
    ];
  }
  const why = best.passes ? (best.notRanked ?? "it is not ranked") : failureWords(best, result);
  const lead: VerdictPart[] = [{ text: "No option passes", tone: "fail" }];
  if (isBare(best)) return [...lead, { text: ": none does better than the bare column." }];
  return [
    ...lead,
    { text: ". The nearest is " },
    { text: best.name, tone: "strong" },
    { text: `, where ${why}.` },
  ];
}

/** "84 EUR more", or equal to the unit shown. */
function dearerWords(best: Evaluated, next: Evaluated): string {
  const difference = next.estimate.cost - best.estimate.cost;
  if (difference < 0.005) return "at the same cost";
  return `${money(difference, next.estimate.currency)} more`;
}

function rankedParts(result: ResultDocument, ranked: readonly Evaluated[]): readonly VerdictPart[] {
  const [best, next] = ranked;
  if (best === undefined) return nothingPassesParts(result);
  if (isBare(best)) {
    const dearer: VerdictPart[] =
      next === undefined
        ? []
        : [
            { text: ` The cheapest stiffening would be ` },
            { text: lowerFirst(next.name) },
            { text: `, ${dearerWords(best, next)} a node.` },
          ];
    return [{ text: "No stiffening is needed", tone: "strong" }, { text: "." }, ...dearer];
  }
  const { cost, currency, shopMinutes } = best.estimate;
  const time = Math.round(shopMinutes) === 0 ? "no added shop time" : `${hours(shopMinutes)} in the shop`;
  const tail =
    next === undefined
      ? " No other option passes."
      : ` Next comes ${lowerFirst(next.name)}, ${dearerWords(best, next)}.`;
  return [
    { text: "The cheapest that passes is " },
    { text: lowerFirst(best.name), tone: "strong" },
    { text: `: ${money(cost, currency)} and ${time} a node.${tail}` },
  ];
}

/**
 * The comparison in one or two plain sentences: whether the bare column is good enough and what
 * governs it, which option is the cheapest that passes, what it costs and how far off the next is.
 * Reads ranks as they stand in the document, so it agrees with the heads of the columns.
 */
export function verdictSentence(result: ResultDocument): Verdict {
  const ranked = result.options
    .filter(isEvaluated)
    .filter((option) => option.rank !== null)
    .sort((a, b) => (a.rank ?? 0) - (b.rank ?? 0));
  const failure = ranked.length === 0 ? connectionFailureOf(result) : null;
  const closing =
    result.options.length === 0
      ? [{ text: "There is no option to compare." }]
      : failure !== null
        ? connectionParts(failure)
        : rankedParts(result, ranked);
  const parts = [...bareParts(result), ...closing];
  return { text: parts.map((part) => part.text).join(""), parts };
}
