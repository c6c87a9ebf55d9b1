import { spawnSync } from "node:child_process";
import { existsSync } from "node:fs";
import { installDebianPackages } from "./apt.mjs";
import { aptCommand } from "./messages.mjs";
import { isRoot } from "./paths.mjs";

/** Where Debian puts Chromium; the browser tests use no other. */
export const CHROMIUM = "/usr/bin/chromium";
const PYTHON = "/usr/bin/python3";
const MODULES = {
  astropy: "python3-astropy",
  erfa: "python3-erfa",
  scipy: "python3-scipy",
  uncertainties: "python3-uncertainties",
};

/** @returns {string[]} the Debian packages that the tests use and this machine lacks */
export function missingTestPackages() {
  const missing = existsSync(CHROMIUM) ? [] : ["chromium"];
  for (const [module, name] of Object.entries(MODULES)) {
    const look = `import importlib.util, sys; sys.exit(importlib.util.find_spec("${module}") is None)`;
    if (spawnSync(PYTHON, ["-c", look]).status !== 0) missing.push(name);
  }
  return missing;
}

/**
 * What the tests must do without. As root the packages are installed, so that it is nothing; where that fails, so do the
 * tests, unless ALIDADE_REFERENCE_LIBRARIES=absent says that it is meant.
 * @param {import("./bootstrap.mjs").Run} run
 */
export async function requireTestPackages(run) {
  const leftOut = process.env.ALIDADE_REFERENCE_LIBRARIES === "absent";
  if (isRoot && !leftOut && missingTestPackages().length > 0) {
    console.log("Installing what the tests compare with ...");
    await installDebianPackages(missingTestPackages(), run);
  }
  const missing = missingTestPackages();
  if (missing.length > 0) {
    console.log(
      `Not installed: ${missing.join(", ")}. What needs them is skipped. To run it, ask for: ${aptCommand(missing)}`,
    );
  }
  return { browser: missing.includes("chromium"), references: missing.some((name) => name !== "chromium") };
}
