import { and, desc, eq, lt } from "drizzle-orm";
import { db } from "#app/database/db.server.ts";
import { auditEntry } from "#app/database/schema/audit.ts";

export interface HistoryFilter {
  objectType?: string;
  objectId?: string;
  personId?: string;
  /** Entries older than this id: the next page. */
  before?: string;
}

const PAGE = 50;

/** The audit log, newest first, of one object, one person or all; `next` is the `before` of the page after this one. */
export async function readHistory(filter: HistoryFilter) {
  const rows = await db()
    .select()
    .from(auditEntry)
    .where(
      and(
        filter.objectType ? eq(auditEntry.objectType, filter.objectType) : undefined,
        filter.objectId ? eq(auditEntry.objectId, filter.objectId) : undefined,
        filter.personId ? eq(auditEntry.personId, filter.personId) : undefined,
        filter.before ? lt(auditEntry.id, filter.before) : undefined,
      ),
    )
    .orderBy(desc(auditEntry.id))
    .limit(PAGE + 1);
  const entries = rows.slice(0, PAGE).map((row) => ({
    ...row,
    at: row.at.toISOString(),
    differences: differences(row.before, row.after),
  }));
  return { entries, next: rows.length > PAGE ? (entries.at(-1)?.id ?? null) : null };
}

export interface Difference {
  field: string;
  before: string | null;
  after: string | null;
}

function shown(value: unknown): string | null {
  if (value === undefined || value === null) return null;
  return typeof value === "string" ? value : JSON.stringify(value);
}

/** Field by field, what an entry changed. States that are no objects are one field named "value". */
export function differences(before: unknown, after: unknown): Difference[] {
  const left = asFields(before);
  const right = asFields(after);
  const names = [...new Set([...Object.keys(left), ...Object.keys(right)])];
  return names
    .map((field) => ({ field, before: shown(left[field]), after: shown(right[field]) }))
    .filter((difference) => difference.before !== difference.after);
}

function asFields(state: unknown): Record<string, unknown> {
  if (state === null || state === undefined) return {};
  if (typeof state === "object" && !Array.isArray(state)) return state as Record<string, unknown>;
  return { value: state };
}
