import { spawn } from "node:child_process";
import { readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { inject } from "vitest";
import { ROOT } from "#storage/paths.mjs";
import { freePort } from "#storage/ports.mjs";
import { MARK } from "#storage/processes.mjs";

export interface SecondServer {
  base: string;
  /** Everything it wrote to its log so far. */
  log: () => string;
  stop: () => void;
}

/** The same build and services once more, with some variables of the environment changed. */
export async function startSecondServer(changed: Record<string, string>): Promise<SecondServer> {
  const folder = dirname(inject("accountsFile"));
  const stack = JSON.parse(readFileSync(join(folder, "environment.json"), "utf8"));
  const port = await freePort();
  const base = `http://127.0.0.1:${port}`;
  const { VITEST: _, ...environment } = process.env;
  // Marked as a child of the stack, so that it ends with it whatever happens to the tests.
  const own = { [MARK]: folder, NODE_ENV: "production", HOST: "127.0.0.1", PORT: String(port), PUBLIC_URL: base };
  const program = join(ROOT, "node_modules", "@react-router", "serve", "bin.js");
  const server = spawn(process.execPath, [program, join(ROOT, "build", "server", "index.js")], {
    cwd: ROOT,
    env: { ...environment, ...stack, ...own, ...changed },
    stdio: ["ignore", "pipe", "pipe"],
  });
  let written = "";
  const hear = (chunk: Buffer) => {
    written += chunk;
  };
  server.stdout.on("data", hear);
  server.stderr.on("data", hear);
  for (let tries = 0; tries < 200; tries += 1) {
    if (await fetch(`${base}/healthz`).catch(() => null)) {
      return { base, log: () => written, stop: () => void server.kill("SIGTERM") };
    }
    await pause(100);
  }
  server.kill("SIGTERM");
  throw new Error(`The second server does not answer. It wrote:\n${written}`);
}
