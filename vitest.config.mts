import react from "@vitejs/plugin-react";
import { defineConfig } from "vitest/config";

/**
 * Four projects: `unit` and `component` need nothing, `database` needs TEST_DATABASE_URL, `e2e` needs
 * that, a production build and Chromium. `npm test` sets all of it up.
 */
export default defineConfig({
  resolve: { tsconfigPaths: true },
  plugins: [react()],
  test: {
    passWithNoTests: false,
    allowOnly: false,
    env: { LOG_LEVEL: "silent" },
    projects: [
      {
        extends: true,
        test: {
          name: "unit",
          environment: "node",
          include: ["tests/{lib,published,properties,architecture}/**/*.test.ts"],
          testTimeout: 30_000,
        },
      },
      {
        extends: true,
        test: {
          name: "component",
          environment: "jsdom",
          include: ["tests/components/**/*.test.{ts,tsx}"],
          setupFiles: ["tests/support/component-setup.ts"],
          testTimeout: 15_000,
        },
      },
      {
        extends: true,
        test: {
          name: "database",
          environment: "node",
          include: ["tests/{db,app,scripts}/**/*.test.ts"],
          globalSetup: ["tests/support/database-setup.ts"],
          fileParallelism: false,
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        extends: true,
        test: {
          name: "e2e",
          environment: "node",
          include: ["tests/e2e/**/*.test.ts"],
          globalSetup: ["tests/support/server-setup.ts"],
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 180_000,
        },
      },
    ],
  },
});
