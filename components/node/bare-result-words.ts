import type { Side } from "@/lib/calc/node";
import type {
  ComponentCheck,
  ComponentId,
  EvaluatedOption,
  Governing,
  JointResult,
  OptionOutcome,
} from "@/lib/calc/result";
import { EVERY_CASE } from "@/components/compare/component-labels";
import { componentOnSide } from "@/lib/ranking/component-words";
import { formatNumber, formatUtilisation } from "@/components/ui/format-number";

/** A piece of a sentence and how it is said. */
export interface SentencePart {
  readonly text: string;
  readonly tone?: "pass" | "fail" | "strong";
}

/** "in ULS 3"; a rule of detailing holds in every load case alike. */
export const inCase = (loadCase: string): string =>
  loadCase === EVERY_CASE ? "in every load case" : `in ${loadCase}`;

/** Utilisations that differ by less than this share are the same. */
const SAME = 1e-6;

/**
 * The check a sentence names: the governing one. Where all is in order a rule of detailing says less than
 * strength does, so the highest utilisation of strength stands for it.
 */
export function namedCheck({ governing, checks }: EvaluatedOption, limit: number): Governing {
  if (governing.component !== "detailing" || governing.utilisation > limit) return governing;
  const strength = checks.filter((check) => check.component !== "detailing");
  const highest = Math.max(...strength.map((check) => check.utilisation));
  const as = strength.filter((check) => check.utilisation >= highest * (1 - SAME));
  // The joint is as highly used as what stops it: name what stops it.
  return as.find((check) => check.component !== "joint-moment") ?? as[0] ?? governing;
}

/** How stiff the softest joint is, in words that go on. */
function softestWords(outcome: EvaluatedOption): string {
  const softest = jointLines(outcome).reduce<JointLine | null>(
    (least, joint) => (least === null || joint.stiffnessKnmPerRad < least.stiffnessKnmPerRad ? joint : least),
    null,
  );
  if (softest === null) return "";
  return `, the ${softest.side} joint is ${softest.stiffnessClass} at ${formatNumber(softest.stiffnessKnmPerRad)} kNm/rad`;
}

/** The bare column in one plain sentence: verdict, governing component, side, load case. */
export function bareSentence(outcome: OptionOutcome, limit: number): readonly SentencePart[] {
  if (outcome.kind === "outside-scope") {
    return [
      { text: "The bare column is " },
      { text: "outside the method", tone: "strong" },
      { text: `: ${outcome.reason}` },
    ];
  }
  const { component, side, loadCase, utilisation } = namedCheck(outcome, limit);
  const what = componentOnSide(component, side);
  const figure = formatUtilisation(utilisation, limit);
  if (outcome.passes) {
    return [
      { text: "The bare column is " },
      { text: "good enough", tone: "pass" },
      { text: `: ${what} is highest at ${figure} ${inCase(loadCase)}.` },
    ];
  }
  if (utilisation <= limit) {
    return [
      { text: "The bare column " },
      { text: "fails", tone: "fail" },
      {
        text: `: it is not as stiff as asked for${softestWords(outcome)}. Strength is enough: ${what} is highest at ${figure} ${inCase(loadCase)}.`,
      },
    ];
  }
  const above = limit === 1 ? "" : `, above the target of ${limit.toFixed(2)}`;
  return [
    { text: "The bare column " },
    { text: "fails", tone: "fail" },
    { text: `: ${what} reaches ${figure} ${inCase(loadCase)}${above}.` },
    ...(outcome.stiffnessReached ? [] : [{ text: " The stiffness asked for is not reached." }]),
  ];
}

/** The same in a few words, for the line that stays in sight. */
export function bareSummary(outcome: OptionOutcome, limit: number): readonly SentencePart[] {
  if (outcome.kind === "outside-scope") {
    return [{ text: "Bare column " }, { text: "outside the method", tone: "strong" }];
  }
  const { component, side, loadCase, utilisation } = namedCheck(outcome, limit);
  return [
    { text: "Bare column " },
    outcome.passes ? { text: "good enough", tone: "pass" } : { text: "fails", tone: "fail" },
    ...(!outcome.passes && utilisation <= limit ? [{ text: " in stiffness, strength" }] : []),
    {
      text: ` ${formatUtilisation(utilisation, limit)}, ${componentOnSide(component, side)} ${inCase(loadCase)}`,
    },
  ];
}

/** The worst check of one component. */
export interface ComponentLine {
  readonly component: ComponentId;
  readonly check: ComponentCheck;
  readonly isGoverning: boolean;
}

/** One line a component, worst check of each, in the order given. */
export function componentLines(
  outcome: EvaluatedOption,
  order: readonly ComponentId[],
  limit: number,
): ComponentLine[] {
  const named = namedCheck(outcome, limit);
  return order.flatMap((component) => {
    const checks = outcome.checks.filter((check) => check.component === component);
    const [first, ...rest] = checks;
    if (!first) return [];
    const check = rest.reduce(
      (worst, other) => (other.utilisation > worst.utilisation ? other : worst),
      first,
    );
    return [{ component, check, isGoverning: named.component === component }];
  });
}

/** What one side's joint can do: the least over the load cases, in kNm and kNm/rad. */
export interface JointLine {
  readonly side: Side;
  readonly resistanceKnm: number;
  readonly strengthClass: JointResult["strengthClass"];
  readonly stiffnessKnmPerRad: number;
  readonly stiffnessClass: JointResult["stiffnessClass"];
}

const NMM_PER_KNM = 1e6;

export function jointLines(outcome: EvaluatedOption): JointLine[] {
  return (["left", "right"] as const).flatMap((side) => {
    const joints = outcome.joints.filter((joint) => joint.side === side);
    const [first, ...rest] = joints;
    if (!first) return [];
    const weakest = rest.reduce(
      (least, joint) => (joint.momentResistanceNmm < least.momentResistanceNmm ? joint : least),
      first,
    );
    const softest = rest.reduce(
      (least, joint) => (joint.initialStiffnessNmmPerRad < least.initialStiffnessNmmPerRad ? joint : least),
      first,
    );
    return [
      {
        side,
        resistanceKnm: weakest.momentResistanceNmm / NMM_PER_KNM,
        strengthClass: weakest.strengthClass,
        stiffnessKnmPerRad: softest.initialStiffnessNmmPerRad / NMM_PER_KNM,
        stiffnessClass: softest.stiffnessClass,
      },
    ];
  });
}
