import { existsSync, readdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import { birthOf, endMarked } from "./processes.mjs";

/**
 * Ends and removes what runs of the tests that were killed left behind. Their folders are named for their process.
 * @param {string} folder where they lie
 */
export async function sweepTests(folder) {
  if (!existsSync(folder)) return;
  for (const name of readdirSync(folder)) {
    const pid = Number(/^test-(?:[a-z]+-)?(\d+)/.exec(name)?.[1]);
    if (!pid || birthOf(pid) !== null) continue;
    await endMarked(join(folder, name), 500);
    rmSync(join(folder, name), { recursive: true, force: true });
  }
}
