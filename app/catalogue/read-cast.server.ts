import { asc, inArray } from "drizzle-orm";
import type { DistanceAnswer } from "#app/astrometry/distance.ts";
import type { Reader } from "#app/database/db.server.ts";
import type { PriorName } from "#app/database/enums.ts";
import { measurement, record, recordName, source } from "#app/database/schema/catalogue.ts";
import { shortCitation } from "./citation.ts";
import { distanceOf, priorOf } from "./distance-of.ts";

export interface CitedSource {
  citation: string;
  bibcode: string | null;
  doi: string | null;
  locator: string | null;
}

/** A record as scenes and figures use it; the distance is worked out from the adopted decimal text. */
export interface CastRecord {
  id: string;
  name: { en: string; fr: string };
  vetted: boolean;
  raDeg: number | null;
  decDeg: number | null;
  epoch: string | null;
  bv: number | null;
  vMag: number | null;
  parallax: { raw: string; value: string; error: string | null; unit: string } | null;
  prior: { name: PriorName; scalePc: number } | null;
  distance: DistanceAnswer | null;
  source: CitedSource | null;
}

/** Records by id, in any order; ids that do not exist are left out. */
export async function readCast(reader: Reader, recordIds: string[]): Promise<CastRecord[]> {
  if (recordIds.length === 0) return [];
  const records = await reader.select().from(record).where(inArray(record.id, recordIds));
  const names = await reader.select().from(recordName).where(inArray(recordName.recordId, recordIds));
  const ledger = await reader
    .select()
    .from(measurement)
    .where(inArray(measurement.recordId, recordIds))
    .orderBy(asc(measurement.id));
  const sourceIds = [...new Set(ledger.flatMap((one) => (one.sourceId ? [one.sourceId] : [])))];
  const sources = sourceIds.length > 0 ? await reader.select().from(source).where(inArray(source.id, sourceIds)) : [];
  return records.map((row) => {
    const own = ledger.filter((one) => one.recordId === row.id);
    const french = names.find((one) => one.recordId === row.id && one.language === "fr" && one.preferred);
    return castRecord(row, french?.name ?? row.name, own, sources);
  });
}

type Measurement = typeof measurement.$inferSelect;
type Source = typeof source.$inferSelect;

function castRecord(
  row: typeof record.$inferSelect,
  french: string,
  ledger: Measurement[],
  sources: Source[],
): CastRecord {
  const adopted = ledger.find((one) => one.id === row.adoptedParallaxId) ?? null;
  const prior = row.prior && row.priorScalePc !== null ? { name: row.prior, scalePc: row.priorScalePc } : null;
  return {
    id: row.id,
    name: { en: row.name, fr: french },
    vetted: row.state === "vetted",
    raDeg: row.raDeg,
    decDeg: row.decDeg,
    epoch: row.positionEpoch,
    bv: newest(ledger, "colour-bv"),
    vMag: newest(ledger, "magnitude-v"),
    parallax: adopted ? { raw: adopted.rawText, value: adopted.value, error: adopted.error, unit: adopted.unit } : null,
    prior,
    distance: distanceOf(adopted, priorOf(row.prior, row.priorScalePc)),
    source: adopted ? cited(adopted, sources) : null,
  };
}

/** The newest value of a quantity that was not set aside. */
function newest(ledger: Measurement[], quantity: Measurement["quantity"]): number | null {
  const standing = ledger.filter((one) => one.quantity === quantity && one.state !== "rejected");
  return standing.at(-1)?.valueCanonical ?? null;
}

function cited(of: Measurement, sources: Source[]): CitedSource | null {
  const found = sources.find((one) => one.id === of.sourceId);
  if (!found) return null;
  return { citation: shortCitation(found), bibcode: found.bibcode, doi: found.doi, locator: of.locator };
}
