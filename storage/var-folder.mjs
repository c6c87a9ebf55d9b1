import { mkdirSync, statfsSync, unlinkSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { diskAlmostFull } from "./messages.mjs";
import { asRefusal, Refusal } from "./refusal.mjs";

/** A new database takes 45 MB, its binary log and the build some more. */
export const NEEDED_MB = 300;

/**
 * Makes the folder of a stack and sees that it can be written to and has room.
 * @param {string} folder
 * @param {{ statfs?: (path: string) => { bavail: number, bsize: number } }} [options]
 */
export function prepareVarFolder(folder, { statfs = statfsSync } = {}) {
  try {
    mkdirSync(join(folder, "logs"), { recursive: true, mode: 0o700 });
    const { bavail, bsize } = statfs(folder);
    const freeMb = Math.floor((bavail * bsize) / 2 ** 20);
    if (freeMb < NEEDED_MB) throw new Refusal(diskAlmostFull(folder, freeMb, NEEDED_MB));
    const probe = join(folder, `probe-${process.pid}`);
    writeFileSync(probe, "x");
    unlinkSync(probe);
  } catch (error) {
    throw asRefusal(error, folder);
  }
}
