import { existsSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { stepFailed } from "./messages.mjs";
import { ROOT } from "./paths.mjs";
import { spawnChild } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";

/** The arguments with which Node runs one of our TypeScript programs. @param {...string} program */
export const typescript = (...program) => ["--import", "tsx", join(ROOT, ...program)];

/**
 * @param {string} name @param {string[]} program @param {import("./bootstrap.mjs").Run} run
 * @param {Record<string, string>} env @param {string} [log] takes what it says; shown when it fails
 */
async function runStep(name, program, { owner, step }, env, log) {
  if (log) rmSync(log, { force: true });
  const code = await step(spawnChild(process.execPath, typescript(...program), { owner, cwd: ROOT, env, log }));
  if (code !== 0 && log) console.error(readFileSync(log, "utf8").trim());
  if (code !== 0) throw new Refusal(stepFailed(name, code));
}

/** @param {import("./bootstrap.mjs").Run} run @param {Record<string, string>} env */
export const checkEnvironment = (run, env) =>
  runStep("Reading the environment", ["storage", "check-environment.ts"], run, env);

/** @param {import("./bootstrap.mjs").Run} run @param {Record<string, string>} env */
export const migrateDatabase = (run, env) => runStep("The migration", ["drizzle", "migrate.ts"], run, env);

/**
 * Loads the demo into a database in which nobody is yet. A demo that was interrupted is begun again from nothing:
 * nobody could have worked in it, since nothing was served before it was whole.
 * @param {import("./bootstrap.mjs").Run} run @param {Record<string, string>} env
 */
export async function loadDemo(run, env) {
  if (!existsSync(join(ROOT, "drizzle", "seed.ts"))) return;
  const unfinished = join(run.owner, "demo-unfinished");
  if (existsSync(unfinished))
    await runStep("Emptying the unfinished demo", ["drizzle", "reset.ts"], run, { ...env, ALIDADE_RESET: "yes" });
  if (!(await hasNobody(env.DATABASE_URL ?? ""))) return;
  console.log("Loading the demo ...");
  writeFileSync(unfinished, new Date().toISOString());
  await runStep("Loading the demo", ["drizzle", "seed.ts"], run, env, join(run.owner, "logs", "demo.log"));
  rmSync(unfinished, { force: true });
}

/** @param {string} url */
async function hasNobody(url) {
  const { default: mysql } = await import("mysql2/promise");
  const connection = await mysql.createConnection(url);
  try {
    const [rows] = await connection.query("SELECT 1 FROM person LIMIT 1");
    return Array.isArray(rows) && rows.length === 0;
  } finally {
    await connection.end();
  }
}
