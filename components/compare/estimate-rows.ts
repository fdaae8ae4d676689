import type { EvaluatedOptionDocument, ResultDocument } from "@/lib/schemas/result-document";
import {
  formatMinutes,
  formatMoney,
  formatNumber,
  formatWholeMoney,
  moneyUnit,
} from "@/components/ui/format-number";
import { across, isEvaluated, type Cell, type Opening, type RowGroup } from "./comparison-cells";

const nothingAdded: Cell = { kind: "none", words: "nothing added" };

function estimateCells(
  result: ResultDocument,
  cell: (option: EvaluatedOptionDocument) => Cell,
): readonly Cell[] {
  return across(result, (option) => (option.measures.length === 0 ? nothingAdded : cell(option)));
}

/** Hours a node: shop, site, and of them each trade. */
export function hoursGroup(result: ResultDocument): RowGroup {
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

/** Cost a node, for all nodes, and a node by category. */
export function costGroup(result: ResultDocument): RowGroup {
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

/** Mass and embodied carbon a node. */
export function massGroup(result: ResultDocument): RowGroup {
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
