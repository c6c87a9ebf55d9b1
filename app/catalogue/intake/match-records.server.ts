import { inArray } from "drizzle-orm";
import { angularSeparationDeg } from "#app/astrometry/coordinates.ts";
import type { Reader } from "#app/database/db.server.ts";
import { record, recordIdentifier } from "#app/database/schema/catalogue.ts";
import type { PlannedRow } from "./plan-row.ts";

const BATCH = 1000;

/** Two positions of one named star, years apart: no star moves further. Common practice, no source. */
const SAME_NAMED_DEG = 5 / 60;
/** The same for names that were made of a prefix and a row's number, which say nothing of the star. */
const SAME_NUMBERED_DEG = 2 / 3600;

export interface Match {
  recordId: string;
  recordName: string;
  /** true: only a name made of prefix and number says that it is the same star. */
  byNumberOnly: boolean;
}

type Kept = { id: string; name: string; raDeg: number | null; decDeg: number | null };

/** The columns of the file that say which star a row is. */
export interface NamingColumns {
  name: string;
  /** By catalogue. */
  identifiers: ReadonlyMap<string, string>;
  /** Names are made of a prefix and the row's number. */
  numbered: (row: PlannedRow) => boolean;
}

/**
 * Row number -> the record that it belongs to, by identifier, else by the same name in the same place. Where the row could
 * be more than one star, or the name is another star's, the row gets a problem instead: nothing is guessed.
 */
export async function matchRecords(
  reader: Reader,
  rows: PlannedRow[],
  columns: NamingColumns,
): Promise<Map<number, Match>> {
  const { byIdentifier, ofRecord, byName, byId } = await readKept(reader, rows);
  const taken = new Map<string, number>();
  const found = new Map<number, Match>();
  for (const row of rows) {
    const say = (column: string, value: string, reason: string) =>
      void row.problems.push({ row: row.row, column, value, reason });
    const known = row.identifiers.flatMap((one) => {
      const kept = byId.get(byIdentifier.get(written(one)) ?? "");
      return kept ? [{ one, kept }] : [];
    });
    const [first] = known;
    const other = known.find(({ kept }) => kept.id !== first?.kept.id);
    if (first && other) {
      const reason = `${written(first.one)} is ${first.kept.name}, ${written(other.one)} is ${other.kept.name}: a row is one star.`;
      say(columns.identifiers.get(other.one.catalogue) ?? "", other.one.value, reason);
      continue;
    }
    const named = first ? [] : (byName.get(row.name.toLowerCase()) ?? []);
    const numbered = columns.numbered(row);
    const refusal = first ? null : nameRefusal(row, named, numbered, ofRecord);
    if (refusal) {
      say(columns.name, row.name, refusal);
      continue;
    }
    const kept = first?.kept ?? named[0];
    if (!kept) continue;
    const before = taken.get(kept.id);
    if (before !== undefined) {
      say(columns.name, row.name, `It is ${kept.name}, as row ${before} is already.`);
      continue;
    }
    taken.set(kept.id, row.row);
    const byNumberOnly = !first && numbered && (!row.position || kept.raDeg === null);
    found.set(row.row, { recordId: kept.id, recordName: kept.name, byNumberOnly });
  }
  return found;
}

/** Why a record of the same name is not the row's star, or cannot be told to be. */
function nameRefusal(
  row: PlannedRow,
  named: Kept[],
  numbered: boolean,
  ofRecord: ReadonlyMap<string, { catalogue: string; value: string }[]>,
): string | null {
  const [kept] = named;
  if (!kept) return null;
  if (named.length > 1) return "More than one record has this name. Give the row an identifier.";
  const own = ofRecord.get(kept.id) ?? [];
  const contrary = own.find((one) =>
    row.identifiers.some((two) => two.catalogue === one.catalogue && two.value !== one.value),
  );
  if (contrary) return `There is a record of this name already, and it is ${written(contrary)}.`;
  if (row.position && kept.raDeg !== null && kept.decDeg !== null) {
    const apart = angularSeparationDeg(row.position.raDeg, row.position.decDeg, kept.raDeg, kept.decDeg);
    if (apart > (numbered ? SAME_NUMBERED_DEG : SAME_NAMED_DEG)) {
      return "There is a record of this name already, at another place in the sky. Choose another name.";
    }
  }
  return null;
}

const written = (one: { catalogue: string; value: string }) => `${one.catalogue} ${one.value}`;

/** What the catalogue keeps under these rows' identifiers and names. */
async function readKept(reader: Reader, rows: PlannedRow[]) {
  const values = rows.flatMap((row) => row.identifiers.map((one) => one.value));
  const identifiers = await inBatches(values, (some) =>
    reader.select().from(recordIdentifier).where(inArray(recordIdentifier.value, some)),
  );
  const byIdentifier = new Map(identifiers.map((one) => [written(one), one.recordId]));
  const names = rows.map((row) => row.name);
  const columns = { id: record.id, name: record.name, raDeg: record.raDeg, decDeg: record.decDeg };
  const sameName = await inBatches(names, (some) =>
    reader.select(columns).from(record).where(inArray(record.name, some)),
  );
  const byOwner = await inBatches([...byIdentifier.values()], (some) =>
    reader.select(columns).from(record).where(inArray(record.id, some)),
  );
  const byId = new Map([...sameName, ...byOwner].map((one) => [one.id, one]));
  const byName = new Map<string, Kept[]>();
  for (const one of new Map(sameName.map((kept) => [kept.id, kept])).values()) {
    const key = one.name.toLowerCase();
    byName.set(key, [...(byName.get(key) ?? []), one]);
  }
  const owned = await inBatches(
    sameName.map((one) => one.id),
    (some) => reader.select().from(recordIdentifier).where(inArray(recordIdentifier.recordId, some)),
  );
  const ofRecord = new Map<string, typeof owned>();
  for (const one of owned) ofRecord.set(one.recordId, [...(ofRecord.get(one.recordId) ?? []), one]);
  return { byIdentifier, ofRecord, byName, byId };
}

/** Many values are asked for some at a time, each once. */
export async function inBatches<T>(values: string[], read: (some: string[]) => PromiseLike<T[]>): Promise<T[]> {
  const each = [...new Set(values)];
  const found: T[] = [];
  for (let from = 0; from < each.length; from += BATCH) found.push(...(await read(each.slice(from, from + BATCH))));
  return found;
}
