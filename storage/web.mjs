import { existsSync } from "node:fs";
import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { doesNotAnswer } from "./messages.mjs";
import { ROOT } from "./paths.mjs";
import { spawnChild } from "./processes.mjs";
import { Refusal } from "./refusal.mjs";
import { typescript } from "./steps.mjs";

const WEB_GRACE_MS = 1200;

/** @typedef {{ owner: string, env: Record<string, string>, host: string, port: number, dev: boolean }} Web */

/** @param {import("./services.mjs").Supervisor} supervisor @param {Web} web */
export async function startWeb(supervisor, web) {
  const start = async () => ({ process: web.dev ? spawnDev(web) : spawnServe(web) });
  await supervisor.add("web server", start, WEB_GRACE_MS);
  await untilItAnswers(supervisor, web);
}

/** @param {Web} web */
function spawnServe({ owner, env, host, port }) {
  const program = join(ROOT, "node_modules", "@react-router", "serve", "bin.js");
  return spawnChild(process.execPath, [program, join(ROOT, "build", "server", "index.js")], {
    owner,
    cwd: ROOT,
    env: { ...env, HOST: host, PORT: String(port) },
    log: join(owner, "logs", "web.log"),
  });
}

/** @param {Web} web */
function spawnDev({ owner, env, host, port }) {
  const program = join(ROOT, "node_modules", "@react-router", "dev", "bin.js");
  const args = [program, "dev", "--host", host, "--port", String(port), "--strictPort"];
  const cache = process.env.ALIDADE_VITE_CACHE ?? join(owner, "vite");
  return spawnChild(process.execPath, args, { owner, cwd: ROOT, env: { ...env, ALIDADE_VITE_CACHE: cache } });
}

/** A server that dies meanwhile is started again, or ends everything: that is the supervisor's to say. @param {import("./services.mjs").Supervisor} supervisor @param {Web} web */
async function untilItAnswers(supervisor, { owner, host, port }) {
  const address = host === "0.0.0.0" || host === "::" ? "127.0.0.1" : host;
  const url = `http://${address.includes(":") ? `[${address}]` : address}:${port}/healthz`;
  const deadline = Date.now() + 90_000;
  while (!supervisor.stopping) {
    const answered = await fetch(url, { signal: AbortSignal.timeout(5000) }).then(
      () => true,
      () => false,
    );
    if (answered) return;
    if (Date.now() > deadline) throw new Refusal(doesNotAnswer(url, join(owner, "logs", "web.log")));
    await pause(100);
  }
}

/** The process that sends what the outbox promises. @param {import("./services.mjs").Supervisor} supervisor @param {Web} web */
export async function startWorker(supervisor, { owner, env, dev }) {
  const program = ["app", "mail", "worker.server.ts"];
  if (!existsSync(join(ROOT, ...program))) return;
  const log = dev ? undefined : join(owner, "logs", "worker.log");
  const spawn = async () => ({
    process: spawnChild(process.execPath, typescript(...program), { owner, cwd: ROOT, env, log }),
  });
  await supervisor.add("outbox worker", spawn, WEB_GRACE_MS);
}
