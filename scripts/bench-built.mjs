import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { build } from "vite";

/**
 * Builds the benchmark as the product is built and runs that: run straight from its sources it would time the
 * names that the source runner gives to every small function. The catalogue's files stay where they are.
 */
const outDir = mkdtempSync(join(process.cwd(), "node_modules", ".bench-"));
const keepUrl = {
  name: "keep-url",
  transform: (code, id) =>
    code.includes("import.meta.url")
      ? code.replaceAll("import.meta.url", JSON.stringify(pathToFileURL(id).href))
      : undefined,
};
try {
  await build({
    configFile: false,
    logLevel: "warn",
    resolve: { tsconfigPaths: true },
    plugins: [keepUrl],
    build: { ssr: "scripts/bench.ts", outDir, emptyOutDir: true, target: "node20", minify: false },
  });
  const ran = spawnSync(process.execPath, ["--expose-gc", join(outDir, "bench.js")], { stdio: "inherit" });
  process.exitCode = ran.status ?? 1;
} finally {
  rmSync(outDir, { recursive: true, force: true });
}
