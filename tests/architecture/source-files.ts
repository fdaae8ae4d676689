import { readdirSync, readFileSync, statSync } from "node:fs";
import path from "node:path";

/** Files of ours below a folder, as paths from the top of the checkout; [] where the folder is not there. */
export function filesUnder(folder: string, pattern: RegExp): string[] {
  let names: string[];
  try {
    names = readdirSync(folder, { recursive: true, encoding: "utf8" });
  } catch {
    return [];
  }
  return names
    .map((name) => path.join(folder, name))
    .filter((file) => pattern.test(file) && !file.includes(`e2e${path.sep}output`) && statSync(file).isFile())
    .sort();
}

export const CODE_FOLDERS = [
  "app",
  "components",
  "lib",
  "models",
  "migrations",
  "seeders",
  "scripts",
  "tests",
] as const;

export const SOURCE = /\.(tsx?|mts|mjs|sh)$/;

export interface Import {
  readonly file: string;
  readonly target: string;
  /** Where it lands, from the top of the checkout and without extension; null for a package. */
  readonly landed: string | null;
}

const IMPORT =
  /(?:^|[\s;}])(?:import|export)\s(?:[^"';]*?\sfrom\s+)?["']([^"']+)["']|\b(?:import|require)\s*\(\s*["']([^"']+)["']/g;

const withoutComments = (text: string): string =>
  text.replace(/\/\*[\s\S]*?\*\//g, "").replace(/^\s*\/\/.*$/gm, "");

/** What a text imports: static, dynamic, type-only and re-exports. */
export function importsIn(file: string, text: string): Import[] {
  return [...withoutComments(text).matchAll(IMPORT)].map((match) => {
    const target = match[1] ?? match[2] ?? "";
    if (target.startsWith("@/")) return { file, target, landed: path.normalize(target.slice(2)) };
    if (target.startsWith("."))
      return { file, target, landed: path.normalize(path.join(path.dirname(file), target)) };
    return { file, target, landed: null };
  });
}

export const importsOf = (file: string): Import[] => importsIn(file, readFileSync(file, "utf8"));
