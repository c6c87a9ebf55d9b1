import { setTimeout as pause } from "node:timers/promises";
import { endChild, endMarked, hasEnded } from "./processes.mjs";

/**
 * A part of the stack that runs.
 * @typedef {{ process: import("node:child_process").ChildProcess }} Part
 */

const MOST_RESTARTS_A_MINUTE = 5;
const RESTART_AFTER_MS = 500;

/**
 * Keeps the parts of a stack running, and ends them in the order opposite to their start.
 * @param {string} owner the stack's folder
 * @param {(name: string) => void} giveUp called once when a part keeps stopping
 */
export function supervise(owner, giveUp) {
  /** @type {{ name: string, part: Part, graceMs: number }[]} */
  const parts = [];
  /** @type {Set<import("node:child_process").ChildProcess>} */
  const steps = new Set();
  let stopping = false;

  /** @param {{ name: string, part: Part, graceMs: number }} entry @param {() => Promise<Part>} start @param {number[]} deaths */
  const watch = (entry, start, deaths) => {
    entry.part.process.once("exit", async () => {
      if (stopping) return;
      const recent = [...deaths.filter((at) => at > Date.now() - 60_000), Date.now()];
      if (recent.length > MOST_RESTARTS_A_MINUTE) return giveUp(entry.name);
      console.error(`The ${entry.name} stopped; starting it again.`);
      await pause(RESTART_AFTER_MS);
      if (stopping) return;
      try {
        entry.part = await start();
      } catch {
        return giveUp(entry.name);
      }
      if (hasEnded(entry.part.process)) return giveUp(entry.name);
      watch(entry, start, recent);
    });
  };

  return {
    /**
     * Starts a part and starts it again whenever it stops by itself.
     * @template {Part} P
     * @param {string} name @param {() => Promise<P>} start @param {number} graceMs how long it may take to end
     * @returns {Promise<P>}
     */
    async add(name, start, graceMs) {
      const part = await start();
      const entry = { name, part, graceMs };
      parts.push(entry);
      watch(entry, start, []);
      return part;
    },
    /**
     * Waits for a child that ends by itself, such as a build.
     * @param {import("node:child_process").ChildProcess} child
     * @returns {Promise<number | null>} its exit code
     */
    async step(child) {
      steps.add(child);
      const code = await new Promise((resolve) => {
        child.once("exit", resolve);
        child.once("error", () => resolve(127));
      });
      steps.delete(child);
      return code;
    },
    get stopping() {
      return stopping;
    },
    /** Ends everything: what answers people first, the database last. At most about 4.5 seconds. */
    async stop() {
      stopping = true;
      const front = parts.filter(({ name }) => name !== "database");
      const ends = [...steps].map((child) => endChild(child, 1000));
      await Promise.all([...ends, ...front.map(({ part, graceMs }) => endChild(part.process, graceMs))]);
      const database = parts.find(({ name }) => name === "database");
      if (database) await endChild(database.part.process, database.graceMs);
      await endMarked(owner, 0);
    },
  };
}
