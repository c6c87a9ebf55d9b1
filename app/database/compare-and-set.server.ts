import { and, eq, sql } from "drizzle-orm";
import type { MySqlColumn, MySqlTable } from "drizzle-orm/mysql-core";
import { Conflict } from "#app/errors.ts";
import type { Transaction } from "./db.server.ts";

type Versioned = MySqlTable & { id: MySqlColumn; version: MySqlColumn };

/**
 * Updates one row if it still has the version the person saw, and counts the version up.
 * @throws Conflict when somebody else saved first.
 */
export async function compareAndSet<T extends Versioned>(
  tx: Transaction,
  table: T,
  id: string,
  seenVersion: number,
  set: Partial<T["$inferInsert"]>,
): Promise<void> {
  const [result] = await tx
    .update(table)
    .set({ ...set, version: sql`${table.version} + 1` } as never)
    .where(and(eq(table.id, id), eq(table.version, seenVersion)));
  if (result.affectedRows !== 1) {
    throw new Conflict("Somebody else saved this while you were working on it. Nothing of yours was written.");
  }
}
