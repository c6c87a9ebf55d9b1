import { index, int, mysqlEnum, mysqlTable, text } from "drizzle-orm/mysql-core";
import { createdAt, id, instant, json } from "../columns.ts";
import { OUTBOX_KINDS } from "../enums.ts";

/** Work promised inside a transaction and done after it by the worker. */
export const outbox = mysqlTable(
  "outbox",
  {
    id: id(),
    kind: mysqlEnum("kind", OUTBOX_KINDS).notNull(),
    payload: json<unknown>("payload").notNull(),
    createdAt: createdAt(),
    /** Not before this moment; pushed back after a failure. */
    availableAt: instant("available_at").notNull(),
    attempts: int("attempts").notNull().default(0),
    lastError: text("last_error"),
    doneAt: instant("done_at"),
    /** Set when it was given up for good; an administrator sees it. */
    failedAt: instant("failed_at"),
  },
  // The worker's question: what is due and not done, oldest first.
  (t) => [index("outbox_due").on(t.doneAt, t.failedAt, t.availableAt)],
);
