import type { Side } from "@/lib/calc/node";
import type {
  ComponentCheck,
  ComponentId,
  EvaluatedOption,
  JointResult,
  OptionOutcome,
} from "@/lib/calc/result";
import { componentOnSide } from "@/lib/ranking/component-words";
import { formatUtilisation } from "@/components/ui/format-number";

/** A piece of a sentence and how it is said. */
export interface SentencePart {
  readonly text: string;
  readonly tone?: "pass" | "fail" | "strong";
}

/** The bare column in one plain sentence: verdict, governing component, side, load case. */
export function bareSentence(outcome: OptionOutcome, limit: number): readonly SentencePart[] {
  if (outcome.kind === "outside-scope") {
    return [
      { text: "The bare column is " },
      { text: "outside scope", tone: "strong" },
      { text: `: ${outcome.reason}` },
    ];
  }
  const { governing } = outcome;
  const reach = `${componentOnSide(governing.component, governing.side)} reaches ${formatUtilisation(governing.utilisation, limit)} in ${governing.loadCase}.`;
  const parts: SentencePart[] = [
    { text: "The bare column " },
    outcome.passes ? { text: "passes", tone: "pass" } : { text: "fails", tone: "fail" },
    { text: `: ${reach}` },
  ];
  if (!outcome.stiffnessReached) parts.push({ text: " The stiffness asked for is not reached." });
  return parts;
}

/** The same in a few words, for the line that stays in sight. */
export function bareSummary(outcome: OptionOutcome, limit: number): readonly SentencePart[] {
  if (outcome.kind === "outside-scope")
    return [{ text: "Bare column " }, { text: "outside scope", tone: "strong" }];
  const { governing, passes } = outcome;
  return [
    { text: "Bare column " },
    passes ? { text: "passes", tone: "pass" } : { text: "fails", tone: "fail" },
    {
      text: ` ${formatUtilisation(governing.utilisation, limit)}, ${componentOnSide(governing.component, governing.side)}, ${governing.loadCase}`,
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
export function componentLines(outcome: EvaluatedOption, order: readonly ComponentId[]): ComponentLine[] {
  return order.flatMap((component) => {
    const checks = outcome.checks.filter((check) => check.component === component);
    const [first, ...rest] = checks;
    if (!first) return [];
    const check = rest.reduce(
      (worst, other) => (other.utilisation > worst.utilisation ? other : worst),
      first,
    );
    return [{ component, check, isGoverning: outcome.governing.component === component }];
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
