/** A time table made ready to run: every expression compiled once, with the names its driver allows. */
import { DRIVERS, type DriverName, type NameKind, SHARED_NAMES } from "./drivers";
import type { RuleFormula, TimeRule, TimeTable } from "./prices";
import { compileExpression, type NumberOf, RESERVED_NAMES, RuleRefused, type RuleWorld } from "./rules";

export interface CompiledUse {
  readonly itemOf: (scope: Readonly<Record<string, number | string>>) => string;
  readonly quantity: NumberOf;
}

export interface CompiledRule {
  readonly rule: TimeRule;
  readonly quantity: NumberOf;
  readonly run: NumberOf | null;
  readonly setUp: NumberOf | null;
  readonly machine: NumberOf | null;
  readonly uses: readonly CompiledUse[];
  /** Source of the minutes in use. */
  readonly source: string;
}

export interface CompiledTimeTable {
  readonly rules: readonly CompiledRule[];
}

/** The formula that a rule's choice names. */
export function chosenFormula(rule: TimeRule): RuleFormula | null {
  if (rule.runMinutes === null) return null;
  const { chosen, formulas } = rule.runMinutes;
  const formula = formulas.find(({ key }) => key === chosen);
  if (formula === undefined) throw new RuleRefused(chosen, `the rule ${rule.key} has no formula of that name`);
  return formula;
}

/** Names that rules of one driver may use, in the order the rules stand: later ones see what earlier ones give. */
function namesOf(driver: DriverName): Map<string, NameKind> {
  return new Map<string, NameKind>([...Object.entries(SHARED_NAMES), ...Object.entries(DRIVERS[driver])]);
}

/** "threaded-bar-{grade}" with the record's own words, or the table's, put in. */
function compileItem(pattern: string, { names, constants }: RuleWorld): CompiledUse["itemOf"] {
  const item = pattern.replace(/\{(\w+)\}/g, (whole, name: string) => {
    const constant = Object.hasOwn(constants, name) ? constants[name]?.value : undefined;
    return typeof constant === "string" ? constant : whole;
  });
  const parts = item.split(/\{(\w+)\}/);
  if (parts.length === 1) return () => item;
  for (const name of parts.filter((_, index) => index % 2 === 1)) {
    if (names.get(name) !== "text") throw new RuleRefused(item, `${name} is no word of this rule's quantities`);
  }
  return (scope) => parts.map((part, index) => (index % 2 === 1 ? scope[part] : part)).join("");
}

function compileRule(rule: TimeRule, world: RuleWorld): CompiledRule {
  const compile = (expression: string): NumberOf => compileExpression(expression, world);
  const run = chosenFormula(rule);
  // The formulas that are not in use must be sound too: the shop may select them at any moment.
  for (const { expression } of rule.runMinutes?.formulas ?? []) compile(expression);
  return {
    rule,
    quantity: compile(rule.quantity.expression),
    run: run && compile(run.expression),
    setUp: rule.setUpMinutes && compile(rule.setUpMinutes.expression),
    machine: rule.machineMinutes && compile(rule.machineMinutes.expression),
    uses: rule.uses.map((use) => ({ itemOf: compileItem(use.item, world), quantity: compile(use.quantity.expression) })),
    source: run?.source ?? "",
  };
}

function refuseShadows(table: TimeTable, names: ReadonlyMap<string, NameKind>): void {
  const taken = [...Object.keys(table.constants), ...Object.keys(table.lookUps)];
  for (const name of taken) {
    if (names.has(name) || RESERVED_NAMES.includes(name)) throw new RuleRefused(name, "a table or constant may not take the name of a quantity or function");
  }
}

/**
 * Compiles a time table; run once per version, kept for as long as the table lives.
 *
 * @throws RuleRefused where an expression uses anything outside the sandbox or a name its driver does not carry.
 */
export function compileTimeTable(table: TimeTable): CompiledTimeTable {
  const namesByDriver = new Map<DriverName, Map<string, NameKind>>();
  const rules = table.rules.map((rule) => {
    const names = namesByDriver.get(rule.driver) ?? namesOf(rule.driver);
    namesByDriver.set(rule.driver, names);
    refuseShadows(table, names);
    const compiled = compileRule(rule, { names, constants: table.constants, lookUps: table.lookUps });
    if (rule.gives !== null) {
      if (names.has(rule.gives) || RESERVED_NAMES.includes(rule.gives)) throw new RuleRefused(rule.gives, "that name is taken already");
      names.set(rule.gives, "number");
    }
    return compiled;
  });
  return { rules };
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
