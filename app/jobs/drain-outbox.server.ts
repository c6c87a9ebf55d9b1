import { and, asc, eq, isNull, lte } from "drizzle-orm";
import { db } from "#app/database/db.server.ts";
import type { OutboxKind } from "#app/database/enums.ts";
import { outbox } from "#app/database/schema/jobs.ts";

/** Does one promised piece of work; throwing means "not done, try again later". */
export type OutboxHandler = (payload: unknown, id: string) => Promise<void>;
export type OutboxHandlers = Record<OutboxKind, OutboxHandler>;

/** After this many tries (about two days) a piece of work is given up and shown to an administrator. */
export const MOST_ATTEMPTS = 16;
const LONGEST_WAIT_SECONDS = 6 * 3600;

/** Seconds to wait after the nth failure: 5, 10, 20, ... up to six hours. */
export function waitAfter(attempts: number): number {
  return Math.min(5 * 2 ** (attempts - 1), LONGEST_WAIT_SECONDS);
}

/**
 * Does what is due, one row a transaction, oldest first. Rows that another worker holds are skipped.
 * A worker that dies between doing and noting does it again: mails carry the row's id as Message-ID for that reason.
 * @returns how many were done and how many failed this time.
 */
export async function drainOutbox(handlers: OutboxHandlers, most = 50): Promise<{ done: number; failed: number }> {
  const count = { done: 0, failed: 0 };
  for (let taken = 0; taken < most; taken += 1) {
    const outcome = await doOne(handlers);
    if (outcome === "nothing") break;
    count[outcome] += 1;
  }
  return count;
}

async function doOne(handlers: OutboxHandlers): Promise<"done" | "failed" | "nothing"> {
  return db().transaction(async (tx) => {
    const [row] = await tx
      .select()
      .from(outbox)
      .where(and(isNull(outbox.doneAt), isNull(outbox.failedAt), lte(outbox.availableAt, new Date())))
      .orderBy(asc(outbox.id))
      .limit(1)
      .for("update", { skipLocked: true });
    if (!row) return "nothing";
    const attempts = row.attempts + 1;
    try {
      await handlers[row.kind](row.payload, row.id);
    } catch (error) {
      const now = Date.now();
      await tx
        .update(outbox)
        .set({
          attempts,
          lastError: error instanceof Error ? error.message : String(error),
          availableAt: new Date(now + waitAfter(attempts) * 1000),
          failedAt: attempts >= MOST_ATTEMPTS ? new Date(now) : null,
        })
        .where(eq(outbox.id, row.id));
      return "failed";
    }
    const done = { attempts, doneAt: new Date(), lastError: null, payload: withoutText(row.payload) };
    await tx.update(outbox).set(done).where(eq(outbox.id, row.id));
    return "done";
  });
}

/** A mail that is sent may have held a one-time link: to whom it went and about what is kept, its text is not. */
function withoutText(payload: unknown): unknown {
  if (typeof payload !== "object" || payload === null) return payload;
  return Object.fromEntries(Object.entries(payload).filter(([name]) => name !== "text"));
}
