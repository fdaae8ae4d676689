import type { ComponentId } from "@/lib/calc/result";
import type {
  ComponentDocument,
  EvaluatedOptionDocument,
  JointDocument,
  OptionDocument,
  ResultDocument,
} from "@/lib/schemas/result-document";
import { formatNumber } from "@/components/ui/format-number";

import { caseWords, COMPONENT_ROWS, componentLabel, EVERY_CASE, type RowGroupKey } from "./component-labels";
import { across, isEvaluated, type Cell, type LoadCaseChoice, type RowGroup } from "./comparison-cells";
import { costGroup, hoursGroup, massGroup } from "./estimate-rows";

/** The checks of an option in the chosen load case, worst first. */
export function checksOf(
  option: EvaluatedOptionDocument,
  choice: LoadCaseChoice,
  component?: ComponentId,
): readonly ComponentDocument[] {
  return option.components
    .filter(
      (check) =>
        (choice.kind === "envelope" || check.loadCase === choice.name || check.loadCase === EVERY_CASE) &&
        (component === undefined || check.component === component),
    )
    .sort((a, b) => b.utilisation - a.utilisation);
}

/** Which bolt row, level or rule a check is of, its side and its load case, in one phrase. */
export function whereWords(check: ComponentDocument, choice: LoadCaseChoice): string {
  const rows =
    check.rows && check.rows.length > 0
      ? `rows ${check.rows.join(" + ")}`
      : check.row !== undefined
        ? `row ${check.row}`
        : null;
  return [
    check.side,
    check.level,
    rows,
    check.what,
    choice.kind === "envelope" ? caseWords(check.loadCase) : null,
  ]
    .filter(Boolean)
    .join(", ");
}

function utilisationCell(
  option: EvaluatedOptionDocument,
  choice: LoadCaseChoice,
  components: readonly ComponentId[],
  absent: string,
): Cell {
  const worst = checksOf(option, choice).find((check) => components.includes(check.component));
  if (!worst) return { kind: "none", words: absent };
  return {
    kind: "utilisation",
    value: worst.utilisation,
    component: worst.component,
    where: whereWords(worst, choice),
    isGoverning: checksOf(option, choice)[0]?.component === worst.component,
    opens: { about: "component", component: worst.component },
  };
}

const GROUP_TITLES: Readonly<Record<RowGroupKey, string>> = {
  panel: "Utilisation",
  added: "of added parts",
  connection: "of the connection",
};
const ABSENT: Readonly<Record<RowGroupKey, string>> = {
  panel: "does not apply",
  added: "not in this option",
  connection: "does not apply",
};

function utilisationGroup(result: ResultDocument, choice: LoadCaseChoice, key: RowGroupKey): RowGroup | null {
  const present = new Set(
    result.options
      .filter(isEvaluated)
      .flatMap((option) => checksOf(option, choice).map((check) => check.component)),
  );
  const components = COMPONENT_ROWS[key].filter((component) => present.has(component));
  if (components.length === 0) return null;
  return {
    key,
    title: GROUP_TITLES[key],
    startsFolded: key === "connection",
    folded: across(result, (option) => utilisationCell(option, choice, components, ABSENT[key])),
    rows: components.map((component) => ({
      key: component,
      label: componentLabel(component),
      cells: across(result, (option) => utilisationCell(option, choice, [component], ABSENT[key])),
    })),
  };
}

function verdictCell(option: EvaluatedOptionDocument, choice: LoadCaseChoice, limit: number): Cell {
  // The one that the sentence above the table names; rules of detailing that are kept never are.
  const worst =
    choice.kind === "envelope"
      ? option.governing
      : checksOf(option, choice).find((check) => check.component !== "detailing" || check.utilisation > 1);
  const word = option.passes ? "passes" : "fails";
  const note =
    !option.passes && !option.stiffnessReached && option.governing.utilisation <= limit
      ? "not stiff enough"
      : worst
        ? `${componentLabel(worst.component)}, ${worst.side}${choice.kind === "envelope" ? `, ${caseWords(worst.loadCase)}` : ""}`
        : "";
  return {
    kind: "verdict",
    word,
    tone: option.passes ? "pass" : "fail",
    value: worst?.utilisation ?? null,
    note,
    opens: worst ? { about: "component", component: worst.component } : { about: "option" },
  };
}

function verdictGroup(result: ResultDocument, choice: LoadCaseChoice): RowGroup {
  const cells = result.options.map((option): Cell =>
    isEvaluated(option)
      ? verdictCell(option, choice, result.node.target.utilisation)
      : {
          kind: "verdict",
          word: "outside scope",
          tone: "plain",
          value: null,
          note: option.outsideScope.reason,
          opens: { about: "option" },
        },
  );
  return {
    key: "verdict",
    title: null,
    startsFolded: false,
    rows: [{ key: "verdict", label: "Verdict", cells }],
  };
}

function jointsOf(option: EvaluatedOptionDocument, choice: LoadCaseChoice): readonly JointDocument[] {
  return option.joints.filter((joint) => choice.kind === "envelope" || joint.loadCase === choice.name);
}

const least = (
  joints: readonly JointDocument[],
  value: (joint: JointDocument) => number,
): JointDocument | undefined => [...joints].sort((a, b) => value(a) - value(b))[0];

function stiffnessCell(option: EvaluatedOptionDocument, choice: LoadCaseChoice): Cell {
  const softest = least(jointsOf(option, choice), (joint) => joint.initialStiffness);
  if (!softest) return { kind: "none", words: "no joint" };
  return {
    kind: "quantity",
    text: formatNumber(roundTo(softest.initialStiffness, 100)),
    unit: "kNm/rad",
    note: `${softest.stiffnessClass}, ${softest.side}${option.stiffnessReached ? "" : "; target not reached"}`,
    opens: { about: "joint" },
  };
}

const roundTo = (value: number, step: number): number =>
  value >= 10 * step ? Math.round(value / step) * step : value;

function resistanceCell(option: EvaluatedOptionDocument, choice: LoadCaseChoice): Cell {
  const weakest = least(jointsOf(option, choice), (joint) => joint.momentResistance);
  if (!weakest) return { kind: "none", words: "no joint" };
  return {
    kind: "quantity",
    text: formatNumber(weakest.momentResistance, weakest.momentResistance < 100 ? 1 : 0),
    unit: "kNm",
    note: `${weakest.strengthClass.replace("-", " ")}, ${weakest.side}`,
    opens: { about: "joint" },
  };
}

function stiffnessGroup(result: ResultDocument, choice: LoadCaseChoice): RowGroup {
  return {
    key: "stiffness",
    title: "Stiffness",
    startsFolded: false,
    folded: across(result, (option) => stiffnessCell(option, choice)),
    rows: [
      {
        key: "stiffness",
        label: "initial, smaller side",
        cells: across(result, (option) => stiffnessCell(option, choice)),
      },
      {
        key: "resistance",
        label: "moment resistance",
        cells: across(result, (option) => resistanceCell(option, choice)),
      },
    ],
  };
}

/** Cautions that every option inside the method carries: said once, below the table. One option alone keeps its own. */
export function commonCautions(result: ResultDocument): readonly string[] {
  const [first, ...others] = result.options.filter(isEvaluated);
  if (!first || others.length === 0) return [];
  return first.cautions.filter((words) => others.every((option) => option.cautions.includes(words)));
}

function cautionsOf(option: OptionDocument, common: readonly string[]): readonly string[] {
  // Its one caution, why it is outside, already stands in the row of verdicts.
  if (!isEvaluated(option)) return [];
  const own = option.cautions.filter((words) => !common.includes(words));
  return [option.connectionFailure, option.passes ? null : option.sizing, ...own].filter(
    (words): words is string => Boolean(words),
  );
}

function cautionGroup(result: ResultDocument): RowGroup {
  const common = commonCautions(result);
  const cells = result.options.map((option): Cell => {
    const items = cautionsOf(option, common);
    return items.length === 0 ? { kind: "none", words: "none" } : { kind: "list", items };
  });
  return {
    key: "cautions",
    title: "Cautions",
    startsFolded: false,
    folded: cells.map((cell): Cell =>
      cell.kind === "list"
        ? {
            kind: "quantity",
            text: String(cell.items.length),
            unit: cell.items.length === 1 ? "caution" : "cautions",
            opens: { about: "option" },
          }
        : cell,
    ),
    rows: [{ key: "cautions", label: "what to mind", cells }],
  };
}

/**
 * The comparison as rows of cells, groups in reading order: verdict, utilisation, stiffness, hours,
 * cost, steel, cautions. Pure: the table only draws it.
 */
export function comparisonGroups(result: ResultDocument, choice: LoadCaseChoice): readonly RowGroup[] {
  const utilisation = (["panel", "added", "connection"] as const).map((key) =>
    utilisationGroup(result, choice, key),
  );
  return [
    verdictGroup(result, choice),
    ...utilisation.filter((group): group is RowGroup => group !== null),
    stiffnessGroup(result, choice),
    hoursGroup(result),
    costGroup(result),
    massGroup(result),
    cautionGroup(result),
  ];
}
