import { and, asc, count, desc, eq, exists, gt, inArray, like, lt, or, type SQL, sql } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import type { RecordState } from "#app/database/enums.ts";
import { record, recordIdentifier, recordName } from "#app/database/schema/catalogue.ts";
import { authorise } from "#app/people/authorise.ts";
import { parseIdentifier } from "./record-input.ts";

export interface RecordQuery {
  /** Part of any name, or an identifier such as "HIP 91262". */
  search: string;
  state: RecordState | null;
  sort: "name" | "distance";
  descending: boolean;
  /** The row after which the page begins (or, backwards, before which it ends): "<sort value>~<id>". */
  after: string | null;
  before: string | null;
}

const PAGE = 50;
/** What a record without a distance is sorted by: it stands last, whichever way the table runs. */
const farOf = ({ descending }: RecordQuery) => (descending ? -1 : 1e30);
const distanceKeyOf = (query: RecordQuery) => sql<number>`coalesce(${record.distancePc}, ${farOf(query)})`;

/** One page of the table, keyset both ways: the hundredth page costs what the first does. */
export async function readRecords(actor: Actor | null, query: RecordQuery) {
  authorise(actor, "catalogue.read");
  const matching = and(searchFor(query.search), query.state ? eq(record.state, query.state) : undefined);
  const backwards = query.before !== null && query.after === null;
  const rows = await db()
    .select()
    .from(record)
    .where(and(matching, beyond(query, backwards)))
    .orderBy(...order(query, backwards))
    .limit(PAGE + 1);
  const more = rows.length > PAGE;
  const page = rows.slice(0, PAGE);
  if (backwards) page.reverse();
  const [total] = await db().select({ count: count() }).from(record).where(matching);
  const identifiers = await readIdentifiers(page.map((row) => row.id));
  return {
    total: total?.count ?? 0,
    rows: page.map((row) => ({
      id: row.id,
      name: row.name,
      kind: row.kind,
      state: row.state,
      identifiers: identifiers.get(row.id) ?? [],
      regime: row.regime,
      method: row.distanceMethod,
      distancePc:
        row.distancePc !== null && row.distanceLowPc !== null && row.distanceHighPc !== null
          ? { value: row.distancePc, low: row.distanceLowPc, high: row.distanceHighPc }
          : null,
    })),
    previous: (backwards ? more : query.after !== null) ? keyOf(query, page.at(0)) : null,
    next: (backwards ? true : more) ? keyOf(query, page.at(-1)) : null,
  };
}

type Row = typeof record.$inferSelect;

function keyOf(query: RecordQuery, row: Row | undefined): string | null {
  if (!row) return null;
  return query.sort === "name" ? `${row.name}~${row.id}` : `${row.distancePc ?? farOf(query)}~${row.id}`;
}

function searchFor(search: string): SQL | undefined {
  const text = search.trim();
  if (!text) return undefined;
  const part = `%${text.replace(/[\\%_]/g, "\\$&")}%`;
  const identifier = parseIdentifier(text);
  const sameIdentifier = identifier
    ? and(eq(recordIdentifier.catalogue, identifier.catalogue), eq(recordIdentifier.value, identifier.value))
    : eq(recordIdentifier.value, text.replace(/\s+/g, "").toUpperCase());
  return or(
    like(record.name, part),
    exists(
      db()
        .select({ id: recordName.id })
        .from(recordName)
        .where(and(eq(recordName.recordId, record.id), like(recordName.name, part))),
    ),
    exists(
      db()
        .select({ id: recordIdentifier.id })
        .from(recordIdentifier)
        .where(and(eq(recordIdentifier.recordId, record.id), sameIdentifier)),
    ),
  );
}

function beyond(query: RecordQuery, backwards: boolean): SQL | undefined {
  const { sort, descending, after, before } = query;
  const key = backwards ? before : after;
  const cut = key?.lastIndexOf("~") ?? -1;
  if (!key || cut < 0) return undefined;
  const [value, id] = [key.slice(0, cut), key.slice(cut + 1)];
  const further = descending === backwards ? gt : lt;
  if (sort === "name") {
    return or(further(record.name, value), and(eq(record.name, value), further(record.id, id)));
  }
  const distance = Number(value);
  if (!Number.isFinite(distance)) return undefined;
  const distanceKey = distanceKeyOf(query);
  return or(further(distanceKey, distance), and(eq(distanceKey, distance), further(record.id, id)));
}

function order(query: RecordQuery, backwards: boolean): SQL[] {
  const { sort, descending } = query;
  const direction = descending === backwards ? asc : desc;
  return [direction(sort === "name" ? record.name : distanceKeyOf(query)), direction(record.id)];
}

async function readIdentifiers(ids: string[]): Promise<Map<string, string[]>> {
  const found = new Map<string, string[]>();
  if (ids.length === 0) return found;
  const rows = await db()
    .select()
    .from(recordIdentifier)
    .where(inArray(recordIdentifier.recordId, ids))
    .orderBy(asc(recordIdentifier.id));
  for (const row of rows)
    found.set(row.recordId, [...(found.get(row.recordId) ?? []), `${row.catalogue} ${row.value}`]);
  return found;
}

/** Every record by name, for choosing one in a form. */
export async function readRecordChoices(actor: Actor | null) {
  authorise(actor, "catalogue.read");
  return db()
    .select({ id: record.id, name: record.name, state: record.state, regime: record.regime })
    .from(record)
    .orderBy(asc(record.name), asc(record.id))
    .limit(5000);
}
