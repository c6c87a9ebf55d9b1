import "./dot-env.mjs";
import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { readAddress } from "./address.mjs";
import { requireMariadb, requireNode, requirePackages } from "./bootstrap.mjs";
import { requireBuild } from "./build.mjs";
import { leaveEnvironment, removeEnvironment } from "./local-environment.mjs";
import { giveLockBack, takeLock } from "./lock.mjs";
import { alreadyRuns, cannotListen, keepsStopping, portInUse } from "./messages.mjs";
import { VAR } from "./paths.mjs";
import { portHolder } from "./port-holder.mjs";
import { whyNotFree } from "./ports.mjs";
import { endMarked } from "./processes.mjs";
import { asRefusal, Refusal } from "./refusal.mjs";
import { keptSecret } from "./secrets.mjs";
import { startServices, wantsOwn } from "./services.mjs";
import { checkEnvironment, loadDemo, migrateDatabase } from "./steps.mjs";
import { supervise } from "./supervise.mjs";
import { prepareVarFolder } from "./var-folder.mjs";
import { startWeb, startWorker } from "./web.mjs";

// npm start: everything from a bare checkout to an address that answers. Flags: --dev serves from the sources;
// --services-only starts what stores things and no more; --no-demo loads nothing.

const ALREADY_RUNS = 3;
const flags = new Set(process.argv.slice(2));
const dev = flags.has("--dev");
let locked = false;

const supervisor = supervise(VAR, (name) => {
  console.error(keepsStopping(name, join(VAR, "logs")));
  void end(1);
});

/** @type {Promise<void> | undefined} */
let ending;
/** @param {number} code */
function end(code) {
  ending ??= (async () => {
    // Without the lock everything that runs here is somebody else's.
    if (locked) {
      await supervisor.stop();
      removeEnvironment(VAR);
      giveLockBack(VAR);
    }
    process.exit(code);
  })();
  return ending;
}

for (const signal of /** @type {const} */ (["SIGINT", "SIGTERM", "SIGHUP"])) {
  process.on(signal, () => {
    if (!ending) console.log("Stopping ...");
    void end(0);
  });
}

/** @param {{ host: string, port: number, url: string }} address */
async function claim({ host, port, url }) {
  prepareVarFolder(VAR);
  const holder = takeLock(VAR, url);
  if (holder) throw new Refusal(alreadyRuns(holder), ALREADY_RUNS);
  locked = true;
  const ended = await endMarked(VAR);
  if (ended > 0) console.log(`Ended ${ended} processes that an earlier start left behind.`);
  const why = await whyNotFree(port, host);
  if (why === "EADDRINUSE") throw new Refusal(portInUse(port, host, portHolder(port)));
  if (why) throw new Refusal(cannotListen(port, host, why));
}

/** @param {Record<string, string>} services @param {string} url @returns {Record<string, string>} */
function environmentOfApplication(services, url) {
  return {
    ...services,
    DATABASE_URL: services.DATABASE_URL ?? process.env.DATABASE_URL ?? "",
    SESSION_SECRET: process.env.SESSION_SECRET || keptSecret(join(VAR, "session-secret")),
    PUBLIC_URL: url,
    NODE_ENV: dev ? "development" : "production",
    ALIDADE_VAR: VAR,
  };
}

/** @param {string} url */
function greet(url) {
  const accounts = join(VAR, "demo-accounts.txt");
  console.log(`\nAlidade runs at ${url}`);
  if (existsSync(accounts)) console.log(`\n${readFileSync(accounts, "utf8").trim()}`);
  console.log("\nStop it with Ctrl-C.");
}

async function main() {
  requireNode(process.versions.node);
  const address = readAddress(process.env);
  await claim(address);
  const run = { owner: VAR, step: supervisor.step };
  await requirePackages(run);
  if (wantsOwn().database) await requireMariadb(run);
  const env = environmentOfApplication(await startServices(supervisor, VAR), address.url);
  leaveEnvironment(VAR, env);
  if (flags.has("--services-only")) return console.log("The services run.");
  await checkEnvironment(run, env);
  if (!dev) await requireBuild(run);
  await migrateDatabase(run, env);
  if (wantsOwn().database && !flags.has("--no-demo")) await loadDemo(run, env);
  const web = { owner: VAR, env, dev, ...address };
  await startWorker(supervisor, web);
  await startWeb(supervisor, web);
  if (!supervisor.stopping) greet(address.url);
}

main().catch((error) => {
  if (ending) return;
  const known = asRefusal(error, VAR);
  console.error(known instanceof Refusal ? known.message : known);
  void end(known instanceof Refusal ? known.exitCode : 1);
});
