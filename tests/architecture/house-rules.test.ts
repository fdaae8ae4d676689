/** Guards the rules of the house that no linter knows: where things are, how they are called, how long they get. */
import { execFileSync } from "node:child_process";
import { existsSync, readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, it } from "vitest";
import { CODE_FOLDERS, SOURCE, filesUnder, importsOf } from "./source-files";

const TOP_LEVEL = new Set([
  ...["app", "components", "lib", "models", "migrations", "seeders", "tests", "public", "scripts", ".ci"],
  ...[
    "package.json",
    "package-lock.json",
    "tsconfig.json",
    "next.config.mjs",
    "tailwind.config.ts",
    "README.md",
  ],
  ...["DEVELOPERS.md", "LICENSE", ".env.example", ".npmrc", ".gitignore", ".prettierrc", ".prettierignore"],
  ...["eslint.config.mjs", "vitest.config.mts", "postcss.config.mjs", "proxy.ts"],
]);

const FRONT_DOORS = new Set(["lib/calc/index.ts", "lib/cost/index.ts"]);

/** An index that registers by explicit import, because a bundler cannot follow a read folder. */
const REGISTERS = new Set(["models/index.ts", "seeders/index.ts"]);

const files = CODE_FOLDERS.flatMap((folder) => filesUnder(folder, SOURCE));

describe("the house rules", () => {
  it("finds the code it judges", () => {
    expect(files.length).toBeGreaterThan(100);
  });

  it("keeps the top level to what is known there", () => {
    const tracked = execFileSync("git", ["ls-files", "--cached", "--others", "--exclude-standard"], {
      encoding: "utf8",
    });
    const names = new Set(
      tracked
        .split("\n")
        .filter((line) => line !== "")
        .map((line) => line.split("/")[0]!),
    );
    expect(names.size).toBeGreaterThan(0);
    expect([...names].filter((name) => !TOP_LEVEL.has(name))).toEqual([]);
  });

  it("lets no file grow beyond 400 lines, tables of data aside", () => {
    const long = files.filter(
      (file) => !/[/\\]data[/\\]/.test(file) && readFileSync(file, "utf8").split("\n").length > 401,
    );
    expect(long).toEqual([]);
  });

  it("has no drawer for odds and ends", () => {
    expect(
      files.filter((file) => /(^|[/-])(utils?|helpers?|common|misc|shared)([./-]|$)/.test(file)),
    ).toEqual([]);
  });

  it("names files and folders in kebab-case", () => {
    const segment = /^(\[[a-zA-Z.]+\]|\([a-z-]+\)|[a-z0-9]+(-[a-z0-9]+)*(\.(test|config|d))?(\.[a-z]+)?)$/;
    expect(files.filter((file) => !file.split(path.sep).every((part) => segment.test(part)))).toEqual([]);
  });

  it("has no barrel but the two front doors", () => {
    const indexes = files.filter((file) => /(^|\/)index\.tsx?$/.test(file));
    expect(indexes.filter((file) => !FRONT_DOORS.has(file) && !REGISTERS.has(file))).toEqual([]);
    const onlyPassesOn = (file: string): boolean => {
      const text = readFileSync(file, "utf8")
        .replace(/\/\*[\s\S]*?\*\/|\/\/.*$/gm, "")
        .trim();
      return (
        text !== "" &&
        text.replace(/export\s+(type\s+)?(\*|\{[^}]*\})\s+from\s+["'][^"']+["'];?/g, "").trim() === ""
      );
    };
    const barrels = files.filter(
      (file) => /\.tsx?$/.test(file) && file.startsWith("lib/") && onlyPassesOn(file),
    );
    expect(barrels.filter((file) => !FRONT_DOORS.has(file))).toEqual([]);
  });

  it("reads process.env in the application in one place", () => {
    const readers = files
      .filter((file) => /^(app|components|lib|models|seeders)\//.test(file))
      .filter((file) =>
        /process\s*\.\s*env|process\[/.test(readFileSync(file, "utf8").replace(/\/\*[\s\S]*?\*\//g, "")),
      );
    expect(readers).toEqual(["lib/config/env.ts"]);
  });

  it("skips and singles out no test, and takes no snapshot of a calculation", () => {
    const tests = files.filter((file) => /\.test\.tsx?$/.test(file) && !file.endsWith("house-rules.test.ts"));
    const shunned =
      /\b(it|test|describe)\.(skip|only|todo|skipIf|runIf)\b|toMatchSnapshot|toMatchInlineSnapshot/;
    expect(tests.filter((file) => shunned.test(readFileSync(file, "utf8")))).toEqual([]);
  });

  it("dates and orders every migration", () => {
    const migrations = filesUnder("migrations", /\.ts$/).map((file) => path.basename(file));
    expect(migrations.length).toBeGreaterThan(0);
    expect(migrations.filter((name) => !/^\d{14}-[a-z0-9-]+\.ts$/.test(name))).toEqual([]);
    expect(new Set(migrations.map((name) => name.slice(0, 14))).size).toBe(migrations.length);
  });
});

describe("every rule of the pure core is reached by a test", () => {
  const tests = filesUnder("tests", /\.test\.tsx?$/);
  const resolved = (landed: string): string | undefined =>
    [`${landed}.ts`, `${landed}.tsx`, `${landed}/index.ts`].find((file) => existsSync(file));
  const reached = new Set<string>();
  const follow = (file: string): void => {
    for (const { landed } of importsOf(file)) {
      const next = landed === null ? undefined : resolved(landed);
      if (next === undefined || reached.has(next)) continue;
      reached.add(next);
      follow(next);
    }
  };
  tests.forEach(follow);

  it.each([
    "lib/calc",
    "lib/cost",
    "lib/catalog",
    "lib/ranking",
    "lib/propose",
    "lib/policies",
    "lib/evaluation",
    "lib/drawing",
  ])("%s has no file that no test loads", (folder) => {
    const sources = filesUnder(folder, /\.tsx?$/);
    expect(sources.length).toBeGreaterThan(0);
    expect(sources.filter((file) => !reached.has(file))).toEqual([]);
  });

  it.each(["lib/calc", "lib/cost", "lib/propose", "lib/policies"])("%s has tests of its own", (folder) => {
    expect(filesUnder(path.join("tests", folder), /\.test\.ts$/).length).toBeGreaterThan(0);
  });
});
