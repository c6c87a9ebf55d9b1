import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { stepFailed } from "./messages.mjs";
import { ROOT } from "./paths.mjs";
import { spawnChild } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";

const SOURCES = [
  "app",
  "public",
  "package-lock.json",
  "drizzle/migrations/meta/_journal.json",
  "react-router.config.ts",
  "vite.config.ts",
  "tsconfig.json",
];
const STAMP = join("build", "sources.sha256");
const IS_TEST = /\.test\.tsx?$/;

/** One digest of all that the build is made from. @param {string} [root] */
export function digestOfSources(root = ROOT) {
  const hash = createHash("sha256");
  for (const source of SOURCES) {
    for (const file of filesUnder(root, source))
      hash
        .update(`${file}\0`)
        .update(readFileSync(join(root, file)))
        .update("\0");
  }
  return hash.digest("hex");
}

/** @param {string} root @param {string} path @returns {string[]} */
function filesUnder(root, path) {
  if (!existsSync(join(root, path))) return [];
  try {
    return readdirSync(join(root, path))
      .sort()
      .flatMap((name) => filesUnder(root, join(path, name)));
  } catch {
    return IS_TEST.test(path) ? [] : [path];
  }
}

/** @param {string} [root] */
export function buildIsCurrent(root = ROOT) {
  const built = existsSync(join(root, "build", "server", "index.js")) && existsSync(join(root, STAMP));
  return built && readFileSync(join(root, STAMP), "utf8") === digestOfSources(root);
}

/** Builds when there is no build or the sources changed since. @param {import("./bootstrap.mjs").Run} run */
export async function requireBuild({ owner, step }) {
  if (buildIsCurrent()) return;
  console.log("Building ...");
  rmSync(join(ROOT, STAMP), { force: true });
  const digest = digestOfSources();
  const program = join(ROOT, "node_modules", "@react-router", "dev", "bin.js");
  const env = { NODE_ENV: "production" };
  const code = await step(
    spawnChild(process.execPath, [program, "build", "--logLevel", "warn"], { owner, cwd: ROOT, env }),
  );
  if (code !== 0) throw new Refusal(stepFailed("The build", code));
  writeFileSync(join(ROOT, STAMP), digest);
}
