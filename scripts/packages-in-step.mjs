/**
 * Ends with 0 when node_modules holds exactly what package-lock.json asks for; else prints why not and
 * ends with 1. Plain JavaScript: it runs before anything is installed.
 */
import { readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

const root = dirname(dirname(fileURLToPath(import.meta.url)));

/** @returns {Record<string, { version?: string, integrity?: string, optional?: boolean, link?: boolean }>} */
function packagesIn(/** @type {string} */ file) {
  return JSON.parse(readFileSync(join(root, file), "utf8")).packages;
}

function differences() {
  const wanted = packagesIn("package-lock.json");
  let installed;
  try {
    // npm writes this as the last act of an installation, so an interrupted one leaves none.
    installed = packagesIn("node_modules/.package-lock.json");
  } catch {
    return "none are there yet";
  }
  for (const [path, entry] of Object.entries(wanted)) {
    const found = installed[path];
    // Optional packages are for other kinds of machine; npm leaves them out.
    if (path === "" || (entry.optional && !found)) continue;
    if (!found) return `${path.replace("node_modules/", "")} is missing`;
    if (found.version !== entry.version || found.integrity !== entry.integrity) {
      return `${path.replace("node_modules/", "")} is not the version of the lock file`;
    }
  }
  return null;
}

const difference = differences();
if (difference !== null) {
  console.log(difference);
  process.exitCode = 1;
}
