import "./dot-env.mjs";
import { existsSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { VAR } from "./paths.mjs";

const file = (/** @type {string} */ folder) => join(folder, "environment.json");

/** Leaves the variables of the running stack for the commands that work on its database. @param {string} folder @param {Record<string, string>} environment */
export function leaveEnvironment(folder, environment) {
  writeFileSync(`${file(folder)}.part`, JSON.stringify(environment, null, 2), { mode: 0o600 });
  renameSync(`${file(folder)}.part`, file(folder));
}

/** @param {string} folder */
export function removeEnvironment(folder) {
  rmSync(file(folder), { force: true });
}

/**
 * For db:migrate, db:seed and db:reset: what the environment does not say comes from the stack that runs here.
 * @param {string} [folder]
 * @returns {string} DATABASE_URL
 */
export function takeLocalEnvironment(folder = VAR) {
  if (existsSync(file(folder))) {
    for (const [name, value] of Object.entries(JSON.parse(readFileSync(file(folder), "utf8")))) {
      process.env[name] ??= String(value);
    }
  }
  const { DATABASE_URL } = process.env;
  if (DATABASE_URL) return DATABASE_URL;
  console.error("There is no database to work on: run npm start (or npm run dev) beside this, or set DATABASE_URL.");
  process.exit(1);
}

/** Whether a database is this machine's own; demo and reset refuse any other. @param {string} url */
export function isLocalDatabase(url) {
  return ["127.0.0.1", "localhost", "[::1]"].includes(new URL(url).hostname);
}
