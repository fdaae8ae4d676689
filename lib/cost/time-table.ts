/** A time table made ready to run: every expression compiled once, with the names its driver allows. */
import {
  DRIVER_NAMES,
  DRIVERS,
  type DriverName,
  type NameKind,
  type QuantityRecord,
  SHARED_NAMES,
} from "./drivers";
import type { FabricationCase } from "./estimate";
import type { RuleFormula, TimeRule, TimeTable } from "./prices";
import {
  compileExpression,
  type NameSlot,
  type NumberOf,
  RESERVED_NAMES,
  RuleRefused,
  type RuleWorld,
  type Scope,
} from "./rules";

export interface CompiledUse {
  readonly itemOf: (scope: Scope) => string;
  /** The item where it does not depend on the record. */
  readonly fixedItem: string | null;
  readonly quantity: NumberOf;
}

export interface CompiledRule {
  readonly rule: TimeRule;
  readonly quantity: NumberOf;
  readonly run: NumberOf | null;
  readonly setUp: NumberOf | null;
  readonly machine: NumberOf | null;
  readonly uses: readonly CompiledUse[];
  readonly labourItem: string;
  readonly machineItem: string;
  /** Slot that the run minutes go to; null where no later rule asks for them. */
  readonly givesSlot: number | null;
  /** Source of the minutes in use. */
  readonly source: string;
}

export interface CompiledTimeTable {
  /** In the order they stand in the table. */
  readonly rulesByDriver: ReadonlyMap<DriverName, readonly CompiledRule[]>;
}

/** The formula that a rule's choice names. */
export function chosenFormula(rule: TimeRule): RuleFormula | null {
  if (rule.runMinutes === null) return null;
  const { chosen, formulas } = rule.runMinutes;
  const formula = formulas.find(({ key }) => key === chosen);
  if (formula === undefined)
    throw new RuleRefused(chosen, `the rule ${rule.key} has no formula of that name`);
  return formula;
}

const slotNames = (driver: DriverName): readonly string[] => [
  ...Object.keys(SHARED_NAMES),
  ...Object.keys(DRIVERS[driver]),
];

const SLOT_NAMES = new Map(DRIVER_NAMES.map((driver) => [driver, Object.keys(DRIVERS[driver])]));

/** A record's values in the slots its driver's rules read them from, the shared names first. */
export function slotsOf(
  { driver, values }: QuantityRecord,
  fabrication: FabricationCase,
): (number | string)[] {
  const scope: (number | string)[] = [
    fabrication.quantity,
    fabrication.nodesPerLift,
    fabrication.executionClass,
    fabrication.coating,
  ];
  const read = values as Readonly<Record<string, number | string>>;
  for (const name of SLOT_NAMES.get(driver) ?? []) scope.push(read[name] ?? Number.NaN);
  return scope;
}

/** Names that rules of one driver may use; what a rule gives is added for those that stand after it. */
function namesOf(driver: DriverName): Map<string, NameSlot> {
  const kinds: Readonly<Record<string, NameKind>> = { ...SHARED_NAMES, ...DRIVERS[driver] };
  return new Map(slotNames(driver).map((name, slot) => [name, { kind: kinds[name] ?? "number", slot }]));
}

/** "threaded-bar-{grade}" with the record's own words, or the table's, put in. */
function compileItem(
  pattern: string,
  { names, constants }: RuleWorld,
): Pick<CompiledUse, "itemOf" | "fixedItem"> {
  const item = pattern.replace(/\{(\w+)\}/g, (whole, name: string) => {
    const constant = Object.hasOwn(constants, name) ? constants[name]?.value : undefined;
    return typeof constant === "string" ? constant : whole;
  });
  const parts = item.split(/\{(\w+)\}/);
  if (parts.length === 1) return { itemOf: () => item, fixedItem: item };
  for (const name of parts.filter((_, index) => index % 2 === 1)) {
    if (names.get(name)?.kind !== "text")
      throw new RuleRefused(item, `${name} is no word of this rule's quantities`);
  }
  const readers = parts.map((part, index) => {
    const slot = index % 2 === 1 ? names.get(part)?.slot : undefined;
    return slot === undefined ? () => part : (scope: Scope) => String(scope[slot]);
  });
  const itemOf = (scope: Scope): string => readers.map((read) => read(scope)).join("");
  return { itemOf, fixedItem: null };
}

/** Compiles a rule; its own run minutes, where they have a name, are known to all its other expressions and to later rules. */
function compileRule(rule: TimeRule, names: Map<string, NameSlot>, table: TimeTable): CompiledRule {
  const world: RuleWorld = { names, constants: table.constants, lookUps: table.lookUps };
  const compile = (expression: string): NumberOf => compileExpression(expression, world);
  const chosen = chosenFormula(rule);
  // The formulas that are not in use must be sound too: the shop may select them at any moment.
  for (const { expression } of rule.runMinutes?.formulas ?? []) compile(expression);
  const run = chosen && compile(chosen.expression);
  const givesSlot = rule.gives === null ? null : names.size;
  if (rule.gives !== null && givesSlot !== null) {
    if (names.has(rule.gives) || RESERVED_NAMES.includes(rule.gives))
      throw new RuleRefused(rule.gives, "that name is taken already");
    names.set(rule.gives, { kind: "number", slot: givesSlot });
  }
  return {
    rule,
    quantity: compile(rule.quantity.expression),
    run,
    setUp: rule.setUpMinutes && compile(rule.setUpMinutes.expression),
    machine: rule.machineMinutes && compile(rule.machineMinutes.expression),
    uses: rule.uses.map((use) => ({
      ...compileItem(use.item, world),
      quantity: compile(use.quantity.expression),
    })),
    labourItem: `labour:${rule.trade ?? ""}`,
    machineItem: `machine:${rule.workCentre ?? ""}`,
    givesSlot,
    source: chosen?.source ?? "",
  };
}

function refuseShadows(table: TimeTable, names: ReadonlyMap<string, NameSlot>): void {
  const taken = [...Object.keys(table.constants), ...Object.keys(table.lookUps)];
  for (const name of taken) {
    if (names.has(name) || RESERVED_NAMES.includes(name))
      throw new RuleRefused(name, "a table or constant may not take the name of a quantity or function");
  }
}

/**
 * Compiles a time table; run once per version, kept for as long as the table lives.
 *
 * @throws RuleRefused where an expression uses anything outside the sandbox or a name its driver does not carry.
 */
export function compileTimeTable(table: TimeTable): CompiledTimeTable {
  const namesByDriver = new Map<DriverName, Map<string, NameSlot>>();
  const rulesByDriver = new Map<DriverName, CompiledRule[]>();
  for (const rule of table.rules) {
    const names = namesByDriver.get(rule.driver) ?? namesOf(rule.driver);
    namesByDriver.set(rule.driver, names);
    refuseShadows(table, names);
    const compiled = compileRule(rule, names, table);
    rulesByDriver.set(rule.driver, [...(rulesByDriver.get(rule.driver) ?? []), compiled]);
  }
  return { rulesByDriver };
}

const compiledTables = new WeakMap<TimeTable, CompiledTimeTable>();

/** The compiled form of a time table, made at first use. Tables are never changed in place. */
export function compiledTimeTable(table: TimeTable): CompiledTimeTable {
  const known = compiledTables.get(table);
  if (known !== undefined) return known;
  const compiled = compileTimeTable(table);
  compiledTables.set(table, compiled);
  return compiled;
}
