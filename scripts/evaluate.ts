import { readFileSync } from "node:fs";
import { evaluateDocument } from "@/lib/evaluation/evaluate-document";
import type { StepsWanted } from "@/lib/evaluation/present-outcome";
import { parseShopPrices } from "@/lib/schemas/shop-prices";
import { loadSeedCatalog } from "@/seeders/data/load-catalog";
import { loadSeedPrices } from "@/seeders/data/load-prices";

/**
 * Evaluates one node document without a database:
 * `npm run --silent evaluate -- FILE [--rates FILE] [--steps none|governing|all]`, `-` = standard input.
 * Exit 0 with the result document; 2 with `{ "errors": [...] }` for a bad document or a bad call.
 */
const STEPS: readonly string[] = ["none", "governing", "all"];

class BadCall extends Error {
  constructor(
    readonly path: string,
    message: string,
  ) {
    super(message);
  }
}

interface Call {
  readonly file: string;
  readonly rates: string | null;
  readonly steps: StepsWanted;
}

function readCall(words: readonly string[]): Call {
  let file: string | null = null;
  let rates: string | null = null;
  let steps = "governing";
  for (let index = 0; index < words.length; index += 1) {
    const word = words[index] ?? "";
    if (word === "--rates" || word === "--steps") {
      const value = words[index + 1];
      if (value === undefined) throw new BadCall(word, `Give a value after ${word}.`);
      if (word === "--rates") rates = value;
      else steps = value;
      index += 1;
    } else if (word.startsWith("--")) {
      throw new BadCall(
        word,
        "This setting is not known. Use --rates FILE and --steps none, governing or all.",
      );
    } else if (file === null) file = word;
    else throw new BadCall("FILE", "Give one file, or - for standard input.");
  }
  if (file === null) throw new BadCall("FILE", "Give the file of a node document, or - for standard input.");
  if (!STEPS.includes(steps)) throw new BadCall("--steps", "Choose none, governing or all.");
  return { file, rates, steps: steps as StepsWanted };
}

function readJson(file: string, what: string): unknown {
  let text: string;
  try {
    text = readFileSync(file === "-" ? 0 : file, "utf8");
  } catch (error) {
    throw new BadCall(
      what,
      `${file} cannot be read: ${error instanceof Error ? error.message : String(error)}`,
    );
  }
  try {
    return JSON.parse(text);
  } catch (error) {
    throw new BadCall(what, `${file} is not JSON: ${error instanceof Error ? error.message : String(error)}`);
  }
}

function pricesOf(rates: string | null) {
  if (rates === null) return loadSeedPrices();
  try {
    return parseShopPrices(readJson(rates, "--rates"));
  } catch (error) {
    if (error instanceof BadCall) throw error;
    throw new BadCall("--rates", error instanceof Error ? error.message : String(error));
  }
}

function main(): number {
  try {
    const call = readCall(process.argv.slice(2));
    const shop = { catalog: loadSeedCatalog(), prices: pricesOf(call.rates) };
    const evaluated = evaluateDocument(readJson(call.file, ""), shop, { steps: call.steps });
    process.stdout.write(
      `${JSON.stringify(evaluated.ok ? evaluated.result : { errors: evaluated.errors }, null, 2)}\n`,
    );
    return evaluated.ok ? 0 : 2;
  } catch (error) {
    if (!(error instanceof BadCall)) throw error;
    process.stdout.write(
      `${JSON.stringify({ errors: [{ path: error.path, message: error.message }] }, null, 2)}\n`,
    );
    return 2;
  }
}

process.exitCode = main();
