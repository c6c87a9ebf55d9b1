import { installDebianPackages } from "./apt.mjs";
import { mariadbPrograms } from "./mariadb.mjs";
import { mariadbMissing, programMissing, stepFailed, wrongNode } from "./messages.mjs";
import { packagesAreCurrent } from "./packages.mjs";
import { findProgram, isRoot, ROOT } from "./paths.mjs";
import { spawnChild } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";

/** @typedef {{ owner: string, step: (child: import("node:child_process").ChildProcess) => Promise<number | null> }} Run */

/** @param {string} version such as "20.20.2" */
export function requireNode(version) {
  const [major = 0, minor = 0] = version.split(".").map(Number);
  if (major < 20 || (major === 20 && minor < 19) || major >= 23) throw new Refusal(wrongNode(version));
}

/** npm packages: installed when missing, and again when the lock asks for others. @param {Run} run */
export async function requirePackages({ owner, step }) {
  if (packagesAreCurrent()) return;
  const npm = findProgram("npm");
  if (!npm) throw new Refusal(programMissing("npm"));
  console.log("Installing npm packages ...");
  // Also where NODE_ENV says production: the build needs the packages that build.
  const args = ["ci", "--include=dev", "--no-audit", "--no-fund", "--loglevel=error"];
  const code = await step(spawnChild(npm, args, { owner, cwd: ROOT }));
  if (code !== 0) throw new Refusal(stepFailed("npm ci", code));
}

/**
 * @param {Run} run
 * @param {{ find?: () => unknown, root?: boolean, install?: typeof installDebianPackages }} [machine] for the tests
 */
export async function requireMariadb(
  run,
  { find = mariadbPrograms, root = isRoot, install = installDebianPackages } = {},
) {
  if (find()) return;
  if (!root) throw new Refusal(mariadbMissing());
  console.log("Installing MariaDB ...");
  await install(["mariadb-server"], run);
  if (!find()) throw new Refusal(mariadbMissing());
}
