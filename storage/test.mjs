import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { requireMariadb, requireNode, requirePackages } from "./bootstrap.mjs";
import { requireBuild } from "./build.mjs";
import { countReport, countsLine, sum } from "./count-tests.mjs";
import { ROOT, VAR } from "./paths.mjs";
import { spawnChild } from "./processes.mjs";
import { asRefusal, Refusal } from "./refusal.mjs";
import { supervise } from "./supervise.mjs";
import { sweepTests } from "./sweep.mjs";
import { requireTestPackages } from "./test-packages.mjs";
import { prepareVarFolder } from "./var-folder.mjs";

// npm test: installs what is missing, builds, then lint, types and every test. What follows `--` goes to vitest.
// The tests bring up services of their own (tests/setup); a stack that runs is not touched.

const OWNER = join(VAR, `test-run-${process.pid}`);
const REPORT = join(VAR, `test-report-${process.pid}.json`);
const SUMMARY = process.env.ALIDADE_TEST_SUMMARY;
const argumentsForVitest = process.argv.slice(2);

const { step, stop } = supervise(OWNER, () => {});
let interrupted = false;
for (const signal of /** @type {const} */ (["SIGINT", "SIGTERM", "SIGHUP"])) {
  process.on(signal, async () => {
    if (interrupted) return;
    interrupted = true;
    await stop();
    await sweepTests(VAR);
    process.exit(1);
  });
}

/** @param {string[]} args @param {Record<string, string>} [env] */
const run = (args, env) => step(spawnChild(process.execPath, args, { owner: OWNER, cwd: ROOT, env }));

/** @param {...string} path */
const program = (...path) => join(ROOT, "node_modules", ...path);

/** One check that either holds or does not. @param {string} name @param {string[][]} commands */
async function check(name, commands) {
  const began = Date.now();
  if (interrupted) return { passed: 0, failed: 1, skipped: 0 };
  let ok = true;
  for (const command of commands) ok = (await run(command)) === 0 && ok;
  console.log(`${ok ? "passed" : "FAILED"}: ${name} (${Math.round((Date.now() - began) / 1000)} s)`);
  return { passed: ok ? 1 : 0, failed: ok ? 0 : 1, skipped: 0 };
}

const lint = () =>
  check("lint", [
    [program("@biomejs", "biome", "bin", "biome"), "check", "."],
    [program("dependency-cruiser", "bin", "dependency-cruise.mjs"), "--config", ".dependency-cruiser.mjs", "app"],
  ]);

const typecheck = () =>
  check("typecheck", [
    [program("@react-router", "dev", "bin.js"), "typegen"],
    [program("typescript", "bin", "tsc"), "--noEmit"],
  ]);

/** @param {{ browser: boolean, references: boolean }} without */
async function vitest(without) {
  if (interrupted) return { passed: 0, failed: 1, skipped: 0 };
  const all = ["unit", "server", "reference", ...(without.browser ? [] : ["browser"])];
  const projects = argumentsForVitest.some((argument) => argument.startsWith("--project")) ? [] : all;
  const args = [
    program("vitest", "vitest.mjs"),
    "run",
    ...projects.flatMap((name) => ["--project", name]),
    "--reporter=default",
    "--reporter=json",
    `--outputFile.json=${REPORT}`,
    ...argumentsForVitest,
  ];
  /** @type {Record<string, string>} */
  const env = without.references ? { ALIDADE_REFERENCE_LIBRARIES: "absent" } : {};
  const code = await run(args, { ...env, NODE_ENV: "test" });
  const unseen = without.browser ? browserTestFiles() : 0;
  if (unseen > 0) console.log(`skipped: ${unseen} files of browser tests, because Chromium is not installed`);
  if (!existsSync(REPORT)) return { passed: 0, failed: 1, skipped: unseen };
  const counts = countReport(JSON.parse(readFileSync(REPORT, "utf8")));
  rmSync(REPORT);
  const failed = code === 0 ? counts.failed : Math.max(counts.failed, 1);
  return { ...counts, failed, skipped: counts.skipped + unseen };
}

function browserTestFiles() {
  const folder = join(ROOT, "tests", "browser");
  return existsSync(folder)
    ? readdirSync(folder, { recursive: true }).filter((name) => /\.test\.ts$/.test(String(name))).length
    : 0;
}

async function main() {
  requireNode(process.versions.node);
  prepareVarFolder(VAR);
  const own = { owner: OWNER, step };
  await requirePackages(own);
  await requireMariadb(own);
  const without = await requireTestPackages(own);
  await requireBuild(own);
  const counts = sum(await lint(), await typecheck(), await vitest(without));
  if (interrupted) return 1;
  if (SUMMARY) writeFileSync(SUMMARY, countsLine(counts));
  console.log(countsLine(counts));
  return counts.failed === 0 ? 0 : 1;
}

main().then(
  (code) => {
    if (!interrupted) process.exit(code);
  },
  async (error) => {
    if (interrupted) return;
    const known = asRefusal(error, VAR);
    console.error(known instanceof Refusal ? known.message : known);
    await stop();
    process.exit(1);
  },
);
