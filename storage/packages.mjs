import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { ROOT } from "./paths.mjs";

/**
 * Whether node_modules holds what package-lock.json asks for. npm leaves its own list of what it installed, and writes
 * it last: an install that was interrupted has none.
 * @param {string} [root]
 */
export function packagesAreCurrent(root = ROOT) {
  const installed = readLock(join(root, "node_modules", ".package-lock.json"));
  const wanted = readLock(join(root, "package-lock.json"));
  if (!installed || !wanted) return false;
  return Object.entries(wanted).every(([path, entry]) => {
    if (path === "" || entry.optional || entry.devOptional || entry.peer) return true;
    return installed[path]?.version === entry.version && existsSync(join(root, path));
  });
}

/**
 * @param {string} file
 * @returns {Record<string, { version?: string, optional?: boolean, devOptional?: boolean, peer?: boolean }> | null}
 */
function readLock(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8")).packages;
  } catch {
    return null;
  }
}
