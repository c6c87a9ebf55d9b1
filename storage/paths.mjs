import { accessSync, constants } from "node:fs";
import { delimiter, dirname, join, resolve } from "node:path";
import { fileURLToPath } from "node:url";

/** The project's root folder. */
export const ROOT = dirname(dirname(fileURLToPath(import.meta.url)));

/** Where this stack keeps its data; ALIDADE_VAR moves it, so that several can run side by side. */
export const VAR = resolve(process.env.ALIDADE_VAR ?? join(ROOT, "storage", "var"));

// An ordinary user's PATH often lacks the folders that servers are installed in.
const SERVER_FOLDERS = ["/usr/sbin", "/usr/local/sbin", "/sbin", "/usr/bin", "/usr/local/bin", "/usr/local/mysql/bin"];

/**
 * The full path of a program, from PATH or from the usual folders of servers.
 * @param {...string} names the program's name, then other names it goes by
 * @returns {string | null}
 */
export function findProgram(...names) {
  const folders = [...(process.env.PATH ?? "").split(delimiter), ...SERVER_FOLDERS].filter(Boolean);
  for (const name of names) {
    const folder = folders.find((candidate) => isExecutable(join(candidate, name)));
    if (folder) return join(folder, name);
  }
  return null;
}

/** @param {string} path */
function isExecutable(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

export const isRoot = process.getuid?.() === 0;
