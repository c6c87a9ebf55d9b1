import { setTimeout as pause } from "node:timers/promises";
import { closeDatabase } from "#app/database/db.server.ts";
import { drainOutbox } from "#app/jobs/drain-outbox.server.ts";
import { closeMail, sendMail } from "./send-mail.server.ts";

/** The process that keeps the outbox empty. Mail that is down delays nobody: it is only tried again later. */
const PAUSE_MS = 1000;
const AFTER_ERROR_MS = 5000;
const stopping = new AbortController();

for (const signal of ["SIGTERM", "SIGINT"] as const) process.on(signal, () => stopping.abort());

async function rest(ms: number): Promise<void> {
  await pause(ms, undefined, { signal: stopping.signal }).catch(() => {});
}

while (!stopping.signal.aborted) {
  try {
    const { done, failed } = await drainOutbox({ mail: sendMail });
    if (done + failed > 0) console.log(`outbox: ${done} done, ${failed} to try again`);
    await rest(PAUSE_MS);
  } catch (error) {
    // The database is away: say so and wait; there is nothing to lose here.
    console.error("outbox:", error instanceof Error ? error.message : error);
    await rest(AFTER_ERROR_MS);
  }
}
closeMail();
await closeDatabase();
