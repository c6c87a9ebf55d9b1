import { addMeasurement } from "#app/catalogue/add-measurement.server.ts";
import { adoptParallax } from "#app/catalogue/adopt-parallax.server.ts";
import { createRecord } from "#app/catalogue/create-record.server.ts";
import { createSource } from "#app/catalogue/create-source.server.ts";
import { AddMeasurement } from "#app/catalogue/measurement-input.ts";
import { AdoptParallax, CreateRecord } from "#app/catalogue/record-input.ts";
import { CreateSource } from "#app/catalogue/source-input.ts";
import { vetRecord } from "#app/catalogue/vet-record.server.ts";
import { parseInput } from "#app/parse-input.ts";
import type { Team } from "./accounts.ts";
import { type SeedStar, STARS } from "./stars.ts";

/** Record ids by name. */
export type Catalogue = Map<string, string>;

async function keepSource(team: Team): Promise<string> {
  return createSource(
    team.curator,
    parseInput(CreateSource, {
      designation: "I/311",
      title: "Validation of the new Hipparcos reduction",
      authors: "van Leeuwen, F.",
      year: "2007",
      bibcode: "2007A&A...474..653V",
      doi: "10.1051/0004-6361:20078357",
    }),
  );
}

/** One star as a curator enters it, and as a scientist vets it where its numbers were compared. */
async function keepStar(team: Team, sourceId: string, star: SeedStar): Promise<string> {
  const hip = star.ids.split(";")[0] ?? "";
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
      positionSourceId: sourceId,
      positionLocator: hip,
      positionNote: "from memory, to a second of time or ten of arc",
    }),
  );
  const measure = (quantity: string, printed: string, unit: string) =>
    addMeasurement(
      team.curator,
      parseInput(AddMeasurement, {
        recordId,
        quantity,
        printed,
        unit,
        epoch: "1991.25",
        sourceId,
        locator: hip,
        note: star.checked ? "agrees with I/311" : "from memory",
        ...(star.checked ? {} : { fromMemory: "on" }),
      }),
    );
  const measurementId = await measure("parallax", star.parallax, "mas");
  await measure("magnitude-v", star.v, "mag");
  await measure("colour-bv", star.bv, "mag");
  await adoptParallax(
    team.curator,
    parseInput(AdoptParallax, { recordId, version: 1, measurementId, ...reasons(star) }),
  );
  if (star.checked) await vetRecord(team.scientist, { recordId, version: 2 });
  return recordId;
}

/** Why the parallax counts; and a prior, with its reason, where one over the parallax may not be used. */
function reasons({ parallax }: SeedStar): Record<string, string> {
  const [value = 0, error = 0] = parallax.split(" ± ").map(Number);
  const reason = "The new reduction supersedes the first one, and the star is too bright for later surveys.";
  if (error / value <= 0.2) return { reason };
  return {
    reason,
    prior: "edsd",
    priorScalePc: "1350",
    priorReason: "The whole-sky length of Astraatmadja & Bailer-Jones 2016 (from memory).",
  };
}

export async function keepCatalogue(team: Team): Promise<Catalogue> {
  const sourceId = await keepSource(team);
  const catalogue: Catalogue = new Map();
  for (const star of STARS) catalogue.set(star.name, await keepStar(team, sourceId, star));
  return catalogue;
}
