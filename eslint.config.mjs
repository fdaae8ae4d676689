import js from "@eslint/js";
import { defineConfig, globalIgnores } from "eslint/config";
import nextVitals from "eslint-config-next/core-web-vitals";
import nextTypescript from "eslint-config-next/typescript";
import tseslint from "typescript-eslint";

/**
 * Which folder of lib/ may import from which others, in the spelling `@/lib/...`. These are the pure ones:
 * the same input gives the same output, in a browser, a worker or a test.
 * tests/architecture/walls.test.ts holds the finer table and follows relative paths too.
 */
const PURE_FOLDERS = {
  units: [],
  calc: ["units"],
  catalog: ["units"],
  policies: ["units"],
  cost: ["calc", "catalog", "units"],
  capability: ["calc", "cost", "units"],
  ranking: ["calc", "cost", "capability", "schemas", "units"],
  propose: ["calc", "catalog", "cost", "capability", "ranking", "units"],
  schemas: ["calc", "catalog", "cost", "capability", "policies", "ranking", "units"],
  drawing: ["calc", "catalog", "schemas", "units"],
  report: ["calc", "catalog", "cost", "drawing", "ranking", "schemas", "units"],
  evaluation: ["calc", "catalog", "cost", "capability", "propose", "ranking", "schemas", "units"],
};

const OUTER_PACKAGES = [
  "next",
  "next/*",
  "next-auth",
  "next-auth/*",
  "react",
  "react/*",
  "react-dom",
  "react-dom/*",
  "@tanstack/*",
  "sequelize",
  "umzug",
  "pg",
  "pino",
  "server-only",
  "node:*",
  "fs",
  "fs/*",
  "path",
  "crypto",
  "os",
  "http",
  "https",
];
const OUTER_FOLDERS = [
  "@/app/*",
  "@/components/*",
  "@/models",
  "@/models/*",
  "@/migrations/*",
  "@/seeders",
  "@/seeders/*",
];
const SERVER_FOLDERS = "auth|config|db|http|jobs|log|mail|presenters|services|storage";

const OUTSIDE_WORLD =
  "a pure folder reads no clock, chance, network, browser or environment: take it as an argument";

const walls = [
  ...Object.entries(PURE_FOLDERS).map(([folder, allowed]) => ({
    files: [`lib/${folder}/**/*.ts`],
    rules: {
      "no-restricted-imports": [
        "error",
        {
          patterns: [
            { group: [...OUTER_PACKAGES, ...OUTER_FOLDERS], message: `lib/${folder} is pure` },
            {
              regex: `^@/lib/(?!(${[folder, ...allowed].join("|")})(/|$))`,
              message: `lib/${folder} imports only from: ${allowed.join(", ") || "itself"}`,
            },
          ],
        },
      ],
      "no-restricted-globals": [
        "error",
        ...[
          ...[
            "process",
            "fetch",
            "window",
            "document",
            "navigator",
            "localStorage",
            "sessionStorage",
            "performance",
          ],
          ...[
            "crypto",
            "setTimeout",
            "setInterval",
            "queueMicrotask",
            "XMLHttpRequest",
            "WebSocket",
            "Buffer",
          ],
        ].map((name) => ({ name, message: OUTSIDE_WORLD })),
      ],
      "no-restricted-properties": [
        "error",
        { object: "Date", property: "now", message: OUTSIDE_WORLD },
        { object: "Math", property: "random", message: OUTSIDE_WORLD },
        { object: "globalThis", message: OUTSIDE_WORLD },
      ],
      "no-restricted-syntax": [
        "error",
        { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: OUTSIDE_WORLD },
        { selector: "CallExpression[callee.name='Date']", message: OUTSIDE_WORLD },
      ],
    },
  })),
  {
    files: ["components/**/*.{ts,tsx}", "lib/client/**/*.ts"],
    rules: {
      "no-restricted-imports": [
        "error",
        {
          patterns: [
            {
              group: ["sequelize", "pg", "@/models", "@/models/*", "node:*"],
              message: "the browser asks the API",
            },
            { regex: `^@/lib/(${SERVER_FOLDERS})(/|$)`, message: "the browser asks the API" },
          ],
        },
      ],
    },
  },
  {
    // Only repositories and the connection speak to the models; a migration stands by itself for ever.
    files: ["app/**/*.{ts,tsx}", "lib/{services,http,auth,presenters}/**/*.ts"],
    rules: {
      "no-restricted-imports": [
        "error",
        {
          patterns: [
            { group: ["sequelize", "pg", "@/models", "@/models/*"], message: "ask a repository of lib/db" },
          ],
        },
      ],
    },
  },
  {
    files: ["migrations/**/*.ts"],
    rules: {
      "no-restricted-imports": [
        "error",
        {
          patterns: [
            {
              group: ["@/models", "@/models/*"],
              message: "a migration imports no model: the model will change",
            },
          ],
        },
      ],
    },
  },
];

const readsEnvironment = {
  files: [
    "app/**/*.{ts,tsx}",
    "components/**/*.{ts,tsx}",
    "lib/**/*.{ts,tsx}",
    "models/**/*.ts",
    "seeders/**/*.ts",
  ],
  ignores: ["lib/config/env.ts", ...Object.keys(PURE_FOLDERS).map((folder) => `lib/${folder}/**`)],
  rules: {
    "no-restricted-properties": [
      "error",
      { object: "process", property: "env", message: "only lib/config/env.ts reads the environment" },
    ],
  },
};

export default defineConfig([
  globalIgnores([
    ".next/",
    ".data/",
    "node_modules/",
    "coverage/",
    "public/",
    "next-env.d.ts",
    "tests/e2e/output/",
  ]),
  { linterOptions: { reportUnusedDisableDirectives: "error" } },
  js.configs.recommended,
  ...nextVitals,
  ...nextTypescript,
  {
    files: ["**/*.{ts,tsx,mts}"],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/consistent-type-imports": ["error", { fixStyle: "inline-type-imports" }],
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", varsIgnorePattern: "^_" }],
      // React handlers may be async functions whose promise nobody waits for.
      "@typescript-eslint/no-misused-promises": ["error", { checksVoidReturn: { attributes: false } }],
      eqeqeq: "error",
    },
  },
  {
    files: ["**/*.mjs"],
    languageOptions: {
      globals: {
        console: "readonly",
        process: "readonly",
        fetch: "readonly",
        AbortSignal: "readonly",
        setTimeout: "readonly",
      },
    },
  },
  ...walls,
  readsEnvironment,
]);
