import type { ComponentId } from "@/lib/calc/result";
import type {
  ComponentDocument,
  EvaluatedOptionDocument,
  JointDocument,
  OptionDocument,
  ResultDocument,
} from "@/lib/schemas/result-document";
import {
  formatMinutes,
  formatMoney,
  formatNumber,
  formatWholeMoney,
  moneyUnit,
} from "@/components/ui/format-number";
import { COMPONENT_ROWS, componentLabel, type RowGroupKey } from "./component-labels";

/** What opens when a cell is pressed. */
export type Opening =
  | { readonly about: "component"; readonly component: ComponentId }
  | { readonly about: "joint" }
  | { readonly about: "hours"; readonly trade?: string }
  | { readonly about: "cost"; readonly category?: string }
  | { readonly about: "option" };

export type Cell =
  /** No number here, and why in words: "not added", "outside scope". */
  | { readonly kind: "none"; readonly words: string }
  | {
      readonly kind: "utilisation";
      readonly value: number;
      readonly component: ComponentId;
      /** Where the worst is: "right, ULS 3". */
      readonly where: string;
      readonly isGoverning: boolean;
      readonly opens: Opening;
    }
  | {
      readonly kind: "quantity";
      readonly text: string;
      readonly unit: string;
      readonly note?: string;
      readonly isBig?: boolean;
      readonly opens: Opening | null;
    }
  | {
      readonly kind: "verdict";
      readonly word: string;
      readonly tone: "pass" | "fail" | "plain";
      readonly value: number | null;
      readonly note: string;
      readonly opens: Opening;
    }
  | { readonly kind: "list"; readonly items: readonly string[] };

export interface Row {
  readonly key: string;
  readonly label: string;
  /** A part of the figure above it: "of which welder". */
  readonly isPart?: boolean;
  /** In the order of the options. */
  readonly cells: readonly Cell[];
}

export interface RowGroup {
  readonly key: string;
  /** Null: the rows stand by themselves and do not fold. */
  readonly title: string | null;
  readonly startsFolded: boolean;
  readonly rows: readonly Row[];
  /** One cell an option, shown in the group's own line while it is folded. */
  readonly folded?: readonly Cell[];
}

/** All load cases together, or one of them by name. */
export type LoadCaseChoice = { readonly kind: "envelope" } | { readonly kind: "one"; readonly name: string };

export const isEvaluated = (option: OptionDocument): option is EvaluatedOptionDocument =>
  !("outsideScope" in option);
const OUTSIDE: Cell = { kind: "none", words: "outside scope" };

/** The checks of an option in the chosen load case, worst first. */
export function checksOf(
  option: EvaluatedOptionDocument,
  choice: LoadCaseChoice,
  component?: ComponentId,
): readonly ComponentDocument[] {
  return option.components
    .filter(
      (check) =>
        (choice.kind === "envelope" || check.loadCase === choice.name) &&
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
  return [check.side, check.level, rows, check.what, choice.kind === "envelope" ? check.loadCase : null]
    .filter(Boolean)
    .join(", ");
}

/** One cell an option; an option outside the method never shows a number. */
const across = (result: ResultDocument, cell: (option: EvaluatedOptionDocument) => Cell): readonly Cell[] =>
  result.options.map((option) => (isEvaluated(option) ? cell(option) : OUTSIDE));

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

function verdictCell(option: EvaluatedOptionDocument, choice: LoadCaseChoice): Cell {
  const worst = checksOf(option, choice)[0];
  const word = option.passes ? "passes" : "fails";
  const note =
    !option.passes && !option.stiffnessReached && option.governing.utilisation <= 1
      ? "not stiff enough"
      : worst
        ? `${componentLabel(worst.component)}, ${worst.side}${choice.kind === "envelope" ? `, ${worst.loadCase}` : ""}`
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
      ? verdictCell(option, choice)
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

const nothingAdded: Cell = { kind: "none", words: "nothing added" };

function estimateCells(
  result: ResultDocument,
  cell: (option: EvaluatedOptionDocument) => Cell,
): readonly Cell[] {
  return across(result, (option) => (option.measures.length === 0 ? nothingAdded : cell(option)));
}

function hoursGroup(result: ResultDocument): RowGroup {
  const minutes = (value: number, isBig: boolean, opens: Opening): Cell => ({
    kind: "quantity",
    text: formatMinutes(value),
    unit: "",
    isBig,
    opens,
  });
  const trades = [
    ...new Set(
      result.options.filter(isEvaluated).flatMap((option) => Object.keys(option.estimate.minutesByTrade)),
    ),
  ].sort();
  const shop = estimateCells(result, (option) =>
    minutes(option.estimate.shopMinutes, true, { about: "hours" }),
  );
  return {
    key: "hours",
    title: "Hours added",
    startsFolded: false,
    folded: shop,
    rows: [
      { key: "shop", label: "shop, a node", cells: shop },
      {
        key: "site",
        label: "site, a node",
        cells: estimateCells(result, (option) =>
          minutes(option.estimate.siteMinutes, false, { about: "hours" }),
        ),
      },
      ...trades.map((trade) => ({
        key: `trade-${trade}`,
        label: trade.replaceAll("-", " "),
        isPart: true,
        cells: estimateCells(result, (option) =>
          minutes(option.estimate.minutesByTrade[trade] ?? 0, false, { about: "hours", trade }),
        ),
      })),
    ],
  };
}

function costGroup(result: ResultDocument): RowGroup {
  const money = (value: number, currency: string, isBig: boolean, opens: Opening): Cell => ({
    kind: "quantity",
    text:
      opens.about === "cost" && opens.category !== undefined ? formatWholeMoney(value) : formatMoney(value),
    unit: moneyUnit(currency),
    isBig,
    opens,
  });
  const categories = [
    ...new Set(
      result.options
        .filter(isEvaluated)
        .flatMap(({ estimate }) =>
          Object.entries(estimate.costByCategory).flatMap(([key, value]) => (value === 0 ? [] : [key])),
        ),
    ),
  ];
  const perNode = estimateCells(result, ({ estimate }) =>
    money(estimate.cost, estimate.currency, true, { about: "cost" }),
  );
  return {
    key: "cost",
    title: "Cost added",
    startsFolded: false,
    folded: perNode,
    rows: [
      { key: "cost", label: "a node", cells: perNode },
      {
        key: "cost-quantity",
        label: `all ${result.node.quantity} nodes`,
        cells: estimateCells(result, ({ estimate }) =>
          money(estimate.costForQuantity, estimate.currency, false, { about: "cost" }),
        ),
      },
      ...categories.map((category) => ({
        key: `category-${category}`,
        label: category === "column" ? "heavier column" : category,
        isPart: true,
        cells: estimateCells(result, ({ estimate }) =>
          money(estimate.costByCategory[category] ?? 0, estimate.currency, false, {
            about: "cost",
            category,
          }),
        ),
      })),
    ],
  };
}

function massGroup(result: ResultDocument): RowGroup {
  const quantity = (value: number, unit: string): Cell => ({
    kind: "quantity",
    text: formatNumber(value, value < 100 ? 1 : 0),
    unit,
    opens: { about: "cost" },
  });
  const mass = estimateCells(result, ({ estimate }) => quantity(estimate.mass, "kg"));
  return {
    key: "mass",
    title: "Steel added",
    startsFolded: false,
    folded: mass,
    rows: [
      { key: "mass", label: "mass, a node", cells: mass },
      {
        key: "carbon",
        label: "embodied carbon",
        cells: estimateCells(result, ({ estimate }) => quantity(estimate.carbon, "kg CO₂e")),
      },
    ],
  };
}

function cautionsOf(option: OptionDocument): readonly string[] {
  // Its one caution, why it is outside, already stands in the row of verdicts.
  if (!isEvaluated(option)) return [];
  return [option.connectionFailure, option.passes ? null : option.sizing, ...option.cautions].filter(
    (words): words is string => Boolean(words),
  );
}

function cautionGroup(result: ResultDocument): RowGroup {
  const cells = result.options.map((option): Cell => {
    const items = cautionsOf(option);
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
