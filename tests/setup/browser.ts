import { type ChildProcess, spawn } from "node:child_process";
import { rmSync } from "node:fs";
import { join } from "node:path";
import type { TestProject } from "vitest/node";
import { ROOT, VAR } from "#storage/paths.mjs";
import { freePort } from "#storage/ports.mjs";

declare module "vitest" {
  interface ProvidedContext {
    /** Where the whole application answers, as `npm start` serves it. */
    baseUrl: string;
    /** Where its mail catcher keeps what was sent. */
    mailFolder: string;
    /** The addresses and passwords that the demo printed. */
    accountsFile: string;
  }
}

const PATIENCE_MS = 240_000;
// Empty wins over .env: whatever real services that file names, the tests never touch them.
const OWN_SERVICES = Object.fromEntries(
  [
    "DATABASE_URL",
    "S3_ENDPOINT",
    "S3_BUCKET",
    "S3_ACCESS_KEY_ID",
    "S3_SECRET_ACCESS_KEY",
    "SMTP_URL",
    "PUBLIC_URL",
  ].map((name) => [name, ""]),
);

/** The whole stack, private to one run of the browser tests: built, seeded with the demo, served; gone afterwards. */
export default async function setup(project: TestProject) {
  const folder = join(VAR, `test-browser-${process.pid}`);
  const port = await freePort();
  const { NODE_ENV: _, VITEST: __, ...environment } = process.env;
  const stack = spawn(process.execPath, [join(ROOT, "storage", "start.mjs")], {
    cwd: ROOT,
    env: { ...environment, ...OWN_SERVICES, HOST: "127.0.0.1", PORT: String(port), ALIDADE_VAR: folder },
    stdio: ["ignore", "pipe", "pipe"],
  });
  const end = async () => {
    await ended(stack);
    rmSync(folder, { recursive: true, force: true });
  };
  try {
    await untilItRuns(stack);
  } catch (error) {
    await end();
    throw error;
  }
  project.provide("baseUrl", `http://127.0.0.1:${port}`);
  project.provide("mailFolder", join(folder, "mail"));
  project.provide("accountsFile", join(folder, "demo-accounts.txt"));
  return end;
}

function untilItRuns(stack: ChildProcess): Promise<void> {
  return new Promise((resolve, reject) => {
    let said = "";
    const fail = (why: string) => reject(new Error(`The application ${why}. It said:\n${said}`));
    const timer = setTimeout(() => fail("did not start in time"), PATIENCE_MS);
    const hear = (chunk: Buffer) => {
      said += chunk;
      if (!said.includes("Alidade runs at")) return;
      clearTimeout(timer);
      resolve();
    };
    stack.stdout?.on("data", hear);
    stack.stderr?.on("data", hear);
    stack.once("exit", (code) => {
      clearTimeout(timer);
      fail(`ended with ${code}`);
    });
  });
}

function ended(stack: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    if (stack.exitCode !== null || stack.signalCode !== null) return resolve();
    stack.once("exit", () => resolve());
    stack.kill("SIGTERM");
  });
}
