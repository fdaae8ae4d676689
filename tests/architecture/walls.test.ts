/**
 * Guards the direction of imports: towards the pure core, never out of it. The lint rules say the same
 * while typing, by spelling; this test follows every import to where it lands, relative paths included.
 */
import { readdirSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { filesUnder, importsIn, importsOf, type Import } from "./source-files";

interface Wall {
  /** Folders or single files (without extension) an import may land in. */
  readonly folders: readonly string[];
  readonly packages: readonly string[];
}

/** The input and the answers of the calculation, and its index: all that others see of it. */
const CALC_FRONT = [
  "lib/calc/index",
  "lib/calc",
  "lib/calc/node",
  "lib/calc/result",
  "lib/calc/outcome",
  "lib/calc/trace/trace",
];
const COST_FRONT = ["lib/cost/index", "lib/cost", "lib/cost/estimate", "lib/cost/prices"];

/** Exact: "lib/calc" in these lists is the front door lib/calc/index, not everything below it. */
const FRONT_DOORS = new Set([...CALC_FRONT, ...COST_FRONT]);

const WALLS: Readonly<Record<string, Wall>> = {
  "lib/calc": { folders: ["lib/calc/", "lib/units"], packages: [] },
  "lib/catalog": { folders: ["lib/catalog", "lib/units"], packages: ["zod"] },
  "lib/policies": { folders: ["lib/policies"], packages: [] },
  "lib/cost": {
    // Section properties: the geometry of a mass is that of a strength.
    folders: ["lib/cost/", ...CALC_FRONT, "lib/calc/mechanics/section-properties", "lib/units"],
    packages: ["mathjs", "zod"],
  },
  "lib/ranking": {
    folders: ["lib/ranking", ...CALC_FRONT, ...COST_FRONT, "lib/schemas", "lib/units"],
    packages: [],
  },
  "lib/propose": {
    folders: ["lib/propose", ...CALC_FRONT, ...COST_FRONT, "lib/catalog", "lib/ranking", "lib/units"],
    packages: [],
  },
  "lib/schemas": {
    folders: [
      "lib/schemas",
      ...CALC_FRONT,
      ...COST_FRONT,
      "lib/catalog",
      "lib/policies",
      "lib/ranking",
      "lib/units",
    ],
    packages: ["zod"],
  },
  "lib/drawing": {
    folders: ["lib/drawing", ...CALC_FRONT, "lib/catalog", "lib/schemas", "lib/units"],
    packages: [],
  },
  "lib/evaluation": {
    folders: [
      ...[
        "lib/evaluation",
        ...CALC_FRONT,
        ...COST_FRONT,
        "lib/catalog",
        "lib/propose",
        "lib/ranking",
        "lib/schemas",
      ],
      "lib/units",
    ],
    packages: ["zod"],
  },
  "lib/client": {
    folders: [
      "lib/client",
      "lib/schemas",
      "lib/policies",
      "lib/units",
      ...CALC_FRONT,
      ...COST_FRONT,
      "lib/catalog",
    ],
    packages: ["@tanstack/react-query", "zod", "react"],
  },
  "lib/config": { folders: ["lib/config"], packages: ["zod", "node:path"] },
  "lib/log": { folders: ["lib/log", "lib/config"], packages: ["pino"] },
  "lib/db": {
    folders: [
      "lib/db",
      "lib/config",
      "lib/catalog",
      "lib/policies",
      "lib/schemas",
      ...CALC_FRONT,
      ...COST_FRONT,
      "models",
      "seeders",
    ],
    packages: ["sequelize", "umzug", "node:fs/promises", "node:path", "node:url", "node:crypto"],
  },
  "lib/auth": {
    folders: ["lib/auth", "lib/config", "lib/db", "lib/http", "lib/log", "lib/policies", "lib/schemas"],
    packages: [
      "@node-rs/argon2",
      "node:crypto",
      "next-auth",
      "next-auth/jwt",
      "next-auth/providers/credentials",
      "next/headers",
      "next/navigation",
    ],
  },
  "lib/presenters": {
    folders: [
      "lib/presenters",
      "lib/policies",
      "lib/schemas",
      "lib/db/repositories",
      ...CALC_FRONT,
      ...COST_FRONT,
      "lib/catalog",
      "lib/units",
    ],
    packages: [],
  },
  "lib/services": {
    folders: [
      ...[
        "lib/services",
        "lib/auth",
        "lib/catalog",
        "lib/config",
        "lib/db",
        "lib/evaluation",
        "lib/http",
        "lib/log",
      ],
      ...[
        "lib/policies",
        "lib/presenters",
        "lib/propose",
        "lib/ranking",
        "lib/schemas",
        "lib/units",
        ...CALC_FRONT,
        ...COST_FRONT,
      ],
    ],
    packages: ["node:crypto"],
  },
  "lib/http": {
    folders: ["lib/http", "lib/auth", "lib/config", "lib/log", "lib/policies", "lib/schemas", "lib/db"],
    packages: ["zod", "node:crypto", "next/server"],
  },
  components: {
    folders: [
      ...[
        "components",
        "lib/client",
        "lib/schemas",
        "lib/policies",
        "lib/drawing",
        "lib/evaluation",
        "lib/catalog",
        "lib/ranking",
      ],
      ...["lib/units", ...CALC_FRONT, ...COST_FRONT],
    ],
    packages: [
      "react",
      "react-dom",
      "next/dynamic",
      "next/link",
      "next/navigation",
      "next-auth/react",
      "@tanstack/react-query",
      "recharts",
      "zod",
    ],
  },
  models: { folders: ["models", "lib/policies", "lib/schemas"], packages: ["sequelize"] },
  // A migration stands by itself for ever: it takes only the shape that it is called with.
  migrations: { folders: ["migrations", "lib/db/migrate"], packages: ["sequelize"] },
};

function mayLand(landed: string, wall: Wall): boolean {
  return wall.folders.some((folder) => {
    if (FRONT_DOORS.has(folder)) return landed === folder;
    const below = folder.endsWith("/") ? folder : `${folder}/`;
    return landed === folder || landed === below.slice(0, -1) || landed.startsWith(below);
  });
}

function isBreach(found: Import, wall: Wall): boolean {
  return found.landed === null ? !wall.packages.includes(found.target) : !mayLand(found.landed, wall);
}

const FILES = /\.tsx?$/;

describe.each(Object.entries(WALLS))("%s keeps to its own side of the wall", (folder, wall) => {
  const files = filesUnder(folder, FILES);

  it("has files", () => expect(files.length).toBeGreaterThan(0));

  it("imports only what it may", () => {
    const breaches = files.flatMap(importsOf).filter((found) => isBreach(found, wall));
    expect(breaches.map((found) => `${found.file} imports ${found.target}`)).toEqual([]);
  });
});

describe("the table of walls", () => {
  it("has a line for every folder of lib/", () => {
    const folders = readdirSync("lib", { withFileTypes: true }).filter((entry) => entry.isDirectory());
    const withFiles = folders
      .map((entry) => `lib/${entry.name}`)
      .filter((folder) => filesUnder(folder, FILES).length > 0);
    expect(withFiles.filter((folder) => !(folder in WALLS))).toEqual([]);
  });

  it("sees alias, relative, type-only, dynamic and re-exported imports", () => {
    const text = `
      import { a } from "@/models/section";
      import type { B } from "../../db/sequelize";
      export * from "react";
      import {
        c,
      } from "next/link";
      import "node:fs";
      const d = await import("pg");
      // import { e } from "in-a-comment";
    `;
    const found = importsIn("lib/calc/measures/bars.ts", text);
    expect(found.map(({ landed, target }) => landed ?? target)).toEqual([
      ...["models/section", "lib/db/sequelize", "react", "next/link", "node:fs", "pg"],
    ]);
    expect(found.every((one) => isBreach(one, WALLS["lib/calc"]!))).toBe(true);
  });

  it("lets others in by the front door of the calculation only", () => {
    const through = (target: string): boolean =>
      isBreach(importsIn("lib/propose/x.ts", `import "${target}";`)[0]!, WALLS["lib/propose"]!);
    expect(through("@/lib/calc")).toBe(false);
    expect(through("@/lib/calc/clauses/en1993-1-8-2005/column-web")).toBe(true);
    expect(through("../calc/components/column-web-shear")).toBe(true);
  });
});
