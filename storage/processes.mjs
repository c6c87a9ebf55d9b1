import { spawn } from "node:child_process";
import { closeSync, openSync, readdirSync, readFileSync, renameSync, statSync } from "node:fs";
import { setTimeout as pause } from "node:timers/promises";

/** Every child, and what it starts itself, carries this variable: by it the leftovers of a killed stack are found. */
export const MARK = "ALIDADE_CHILD_OF";

const LARGEST_LOG = 10 * 1024 * 1024;

/**
 * When a process was born, in a form that tells it from a later one with the same number (also after a reboot).
 * @param {number} pid
 * @returns {string | null} null when there is no such process
 */
export function birthOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    // The name may hold spaces and brackets; what follows the last bracket does not. Field 3 is the state, 22 the birth.
    const fields = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
    if (fields[0] === "Z" || fields[0] === "X") return null;
    return `${readFileSync("/proc/sys/kernel/random/boot_id", "utf8").trim()}:${fields[19]}`;
  } catch {
    return null;
  }
}

/** @param {number} pid @param {string} birth */
export function isStill(pid, birth) {
  return birthOf(pid) === birth;
}

/**
 * The processes, other than this one, that a stack with this folder started.
 * @param {string} owner the folder of the stack
 * @returns {number[]}
 */
export function findMarked(owner) {
  const wanted = `${MARK}=${owner}`;
  /** @type {string[]} */
  let entries = [];
  try {
    entries = readdirSync("/proc").filter((entry) => /^\d+$/.test(entry));
  } catch {
    // No /proc: nothing can be found, and a port in use will be named instead.
  }
  return entries.map(Number).filter((pid) => pid !== process.pid && carries(pid, wanted) && birthOf(pid) !== null);
}

/** @param {number} pid @param {string} wanted */
function carries(pid, wanted) {
  try {
    return readFileSync(`/proc/${pid}/environ`, "utf8").split("\0").includes(wanted);
  } catch {
    return false;
  }
}

/**
 * Ends what a killed stack left behind. A database that is killed outright recovers at its next start.
 * @param {string} owner @param {number} [graceMs]
 * @returns {Promise<number>} how many there were
 */
export async function endMarked(owner, graceMs = 8000) {
  const found = findMarked(owner);
  for (const pid of found) signal(pid, "SIGTERM");
  const deadline = Date.now() + graceMs;
  while (findMarked(owner).length > 0 && Date.now() < deadline) await pause(50);
  for (const pid of findMarked(owner)) signal(pid, "SIGKILL");
  while (findMarked(owner).length > 0 && Date.now() < deadline + 2000) await pause(20);
  return found.length;
}

/** @param {number} pid @param {NodeJS.Signals} name */
function signal(pid, name) {
  try {
    process.kill(pid, name);
  } catch {
    // It went by itself.
  }
}

/**
 * Starts a child in its own process group, so that Ctrl-C reaches the supervisor alone, which then ends them in order.
 * @param {string} command
 * @param {string[]} args
 * @param {{ owner: string, env?: Record<string, string | undefined>, cwd?: string, log?: string }} options
 *   log: the file that takes what it says; without, the terminal does
 */
export function spawnChild(command, args, { owner, env = {}, cwd, log }) {
  const out = log ? openLog(log) : "inherit";
  const child = spawn(command, args, {
    cwd,
    detached: true,
    stdio: ["ignore", out, out],
    env: { ...process.env, ...env, [MARK]: owner },
  });
  // Its absence shows as an exit; without a listener Node would throw instead.
  child.on("error", () => {});
  if (typeof out === "number") closeSync(out);
  return child;
}

/** @param {string} file */
function openLog(file) {
  try {
    if (statSync(file).size > LARGEST_LOG) renameSync(file, `${file}.1`);
  } catch {
    // There is none yet.
  }
  return openSync(file, "a", 0o600);
}

/** @param {import("node:child_process").ChildProcess} child */
export const hasEnded = (child) => child.exitCode !== null || child.signalCode !== null || child.pid === undefined;

/**
 * Asks a child's whole group to end, and insists after a while.
 * @param {import("node:child_process").ChildProcess} child
 * @param {number} graceMs
 */
export async function endChild(child, graceMs) {
  if (hasEnded(child) || child.pid === undefined) return;
  const group = -child.pid;
  const gone = new Promise((resolve) => child.once("exit", resolve));
  signal(group, "SIGTERM");
  const waiting = new AbortController();
  await Promise.race([gone, pause(graceMs, undefined, { signal: waiting.signal }).catch(() => {})]);
  waiting.abort();
  signal(group, "SIGKILL");
  if (!hasEnded(child)) await gone;
}
