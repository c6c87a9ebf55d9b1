import { addMeasurement } from "#app/catalogue/add-measurement.server.ts";
import { adoptParallax } from "#app/catalogue/adopt-parallax.server.ts";
import { createRecord } from "#app/catalogue/create-record.server.ts";
import { AddMeasurement } from "#app/catalogue/measurement-input.ts";
import { AdoptParallax, CreateRecord } from "#app/catalogue/record-input.ts";
import { vetRecord } from "#app/catalogue/vet-record.server.ts";
import type { Quantity } from "#app/database/enums.ts";
import { parseInput } from "#app/parse-input.ts";
import type { Team } from "./accounts.ts";
import { keepSources, type Sources } from "./sources.ts";
import { type SeedStar, STARS } from "./stars.ts";

/** Record ids by name. */
export type Catalogue = Map<string, string>;

interface SeedValue {
  quantity: Quantity;
  printed: string;
  unit: string;
  epoch: string;
  sourceId: string;
  locator: string;
  note: string;
  fromMemory: "on" | "no";
}

/** Whether the parallax of Gaia DR3 is the one to adopt: only where that of I/311 is no better proved. */
const prefersGaia = ({ gaia, checked }: SeedStar) => gaia !== null && !checked;

const hipOf = ({ ids }: SeedStar) => /HIP \d+/.exec(ids)?.[0] ?? null;

/** The measurements of a star, the parallax to adopt first. */
export function valuesOf(star: SeedStar, sources: Sources): SeedValue[] {
  const { hipparcos, gaia, v, bv, checked } = star;
  const hip = hipOf(star);
  const values: SeedValue[] = [];
  const fromMemory = { note: "from memory", fromMemory: "on" } as const;
  const agrees = (note: string) => (checked ? ({ note, fromMemory: "no" } as const) : fromMemory);
  if (hipparcos && hip) {
    const parallax = { quantity: "parallax", printed: hipparcos, unit: "mas", epoch: "1991.25" } as const;
    values.push({ ...parallax, sourceId: sources.hipparcos, locator: `I/311, ${hip}`, ...agrees("agrees with I/311") });
  }
  if (gaia) {
    const parallax = { quantity: "parallax", printed: gaia, unit: "mas", epoch: "2016.0" } as const;
    const value = { ...parallax, sourceId: sources.gaia, locator: "", ...fromMemory };
    if (prefersGaia(star)) values.unshift(value);
    else values.push(value);
  }
  const photometry = { unit: "mag", epoch: hip ? "1991.25" : "", sourceId: hip ? sources.photometry : "" };
  const shared = {
    ...photometry,
    locator: hip ? `I/239, ${hip}` : "",
    ...agrees("agrees with a public copy of the Hipparcos tables"),
  };
  values.push({ quantity: "magnitude-v", printed: v, ...shared });
  if (bv !== null) values.push({ quantity: "colour-bv", printed: bv, ...shared });
  return values;
}

/** One star as a curator enters it, and as a scientist vets it where its numbers were compared. */
async function keepStar(team: Team, sources: Sources, star: SeedStar): Promise<string> {
  const hip = hipOf(star);
  const recordId = await createRecord(
    team.curator,
    parseInput(CreateRecord, {
      name: star.name,
      kind: "star",
      otherNames: star.also,
      identifiers: star.ids,
      ra: star.ra,
      dec: star.dec,
      positionEpoch: "2000.0",
      positionSourceId: hip ? sources.hipparcos : "",
      positionLocator: hip ? `I/311, ${hip}` : "",
      positionNote:
        "from memory, to be checked: ICRS at J2000.0 (I/311 itself prints J1991.25), good to about ten seconds of arc",
    }),
  );
  const ids: string[] = [];
  for (const value of valuesOf(star, sources)) {
    ids.push(await addMeasurement(team.curator, parseInput(AddMeasurement, { recordId, ...value })));
  }
  await adoptParallax(
    team.curator,
    parseInput(AdoptParallax, { recordId, version: 1, measurementId: ids[0], ...reasons(star) }),
  );
  if (star.checked) await vetRecord(team.scientist, { recordId, version: 2 });
  return recordId;
}

function reasonOf({ gaia, checked }: SeedStar): string {
  if (!checked) return "From memory: to be compared with its source before anybody vets the record.";
  if (gaia) return "Compared with I/311. Gaia DR3 is sharper, but nobody has compared that value with its source yet.";
  return "The new Hipparcos reduction, compared with I/311. No newer parallax is kept here.";
}

/** Why the parallax counts; and a prior, with its reason, where one over the parallax may not be used. */
function reasons(star: SeedStar): Record<string, string> {
  const adopted = prefersGaia(star) ? star.gaia : star.hipparcos;
  const [value = 0, error = 0] = (adopted ?? "").split(" ± ").map(Number);
  const reason = reasonOf(star);
  if (error / value <= 0.2) return { reason };
  return {
    reason,
    prior: "edsd",
    priorScalePc: "1350",
    priorReason: "The whole-sky length of Astraatmadja & Bailer-Jones 2016 (from memory).",
  };
}

export async function keepCatalogue(team: Team): Promise<Catalogue> {
  const sources = await keepSources(team);
  const catalogue: Catalogue = new Map();
  for (const star of STARS) catalogue.set(star.name, await keepStar(team, sources, star));
  return catalogue;
}
