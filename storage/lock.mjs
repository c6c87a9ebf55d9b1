import { linkSync, readFileSync, renameSync, unlinkSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { birthOf, isStill } from "./processes.mjs";

/**
 * Who runs the stack of a folder.
 * @typedef {{ pid: number, birth: string, url: string, startedAt: string }} Holder
 */

/** @param {string} folder */
const lockFile = (folder) => join(folder, "running.json");

/**
 * Takes the folder's lock, also from a holder that is dead.
 * @param {string} folder
 * @param {string} url where this one will answer
 * @returns {Holder | null} null when it is ours; otherwise who has it
 */
export function takeLock(folder, url) {
  const own = { pid: process.pid, birth: birthOf(process.pid) ?? "", url, startedAt: new Date().toISOString() };
  const aside = join(folder, `running-${process.pid}.json`);
  writeFileSync(aside, JSON.stringify(own));
  try {
    for (let tries = 0; tries < 10; tries += 1) {
      if (linked(aside, lockFile(folder))) return null;
      const holder = readHolder(lockFile(folder));
      if (holder && isStill(holder.pid, holder.birth)) return holder;
      setAside(folder, holder);
    }
    throw new Error(`The lock ${lockFile(folder)} changes all the time; look at what keeps starting Alidade.`);
  } finally {
    unlinkSync(aside);
  }
}

/** Linking a file that was written whole is the one step that only one of two can win. @param {string} from @param {string} to */
function linked(from, to) {
  try {
    linkSync(from, to);
    return true;
  } catch (error) {
    if (/** @type {NodeJS.ErrnoException} */ (error).code === "EEXIST") return false;
    throw error;
  }
}

/** @param {string} file @returns {Holder | null} */
function readHolder(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return null;
  }
}

/** Removes a dead holder's lock; if another start was quicker and it is theirs that was moved, it goes back. @param {string} folder @param {Holder | null} dead */
function setAside(folder, dead) {
  const stale = join(folder, `running-stale-${process.pid}.json`);
  try {
    renameSync(lockFile(folder), stale);
  } catch {
    return;
  }
  const moved = readHolder(stale);
  if (moved && (moved.pid !== dead?.pid || moved.birth !== dead?.birth)) linked(stale, lockFile(folder));
  unlinkSync(stale);
}

/** Gives the lock back, if it is ours. @param {string} folder */
export function giveLockBack(folder) {
  const holder = readHolder(lockFile(folder));
  if (holder?.pid !== process.pid) return;
  try {
    unlinkSync(lockFile(folder));
  } catch {
    // The folder is gone already.
  }
}
