import { join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { ROOT } from "./paths.mjs";
import { freePort, isFree } from "./ports.mjs";
import { hasEnded, spawnChild } from "./processes.mjs";

/**
 * Starts the mail catcher as a process of its own.
 * @param {string} folder where it keeps what was sent
 * @param {{ owner: string, log: string, port?: number }} options
 */
export async function startMail(folder, { owner, log, port: wantedPort = 0 }) {
  const port = await freePort(wantedPort);
  const program = join(ROOT, "storage", "mail-catcher.mjs");
  const child = spawnChild(process.execPath, [program, folder, String(port)], { owner, log });
  for (let tries = 0; tries < 200 && (await isFree(port)); tries += 1) {
    if (hasEnded(child)) throw new Error(`The mail catcher did not start; see ${log}.`);
    await pause(50);
  }
  return { process: child, port, environment: { SMTP_URL: `smtp://127.0.0.1:${port}`, MAIL_CATCHER_DIR: folder } };
}
