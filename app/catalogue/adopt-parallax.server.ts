import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import { measurement } from "#app/database/schema/catalogue.ts";
import { Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { distanceOf, priorOf } from "./distance-of.ts";
import { closeRecord, openRecord, UNVETTED } from "./open-record.server.ts";
import type { AdoptParallax } from "./record-input.ts";

type Input = z.output<typeof AdoptParallax>;

async function adoptable(c: Change, input: Input) {
  const [found] = await c.tx
    .select()
    .from(measurement)
    .where(and(eq(measurement.id, input.measurementId), eq(measurement.recordId, input.recordId)));
  const refuse = (message: string): never => {
    throw new Invalid({ measurementId: [message] });
  };
  if (found?.quantity !== "parallax") return refuse("Choose one of this record's parallaxes.");
  if (found.state === "rejected") return refuse("This measurement is rejected.");
  if (found.error === null) return refuse("A parallax without an error cannot be adopted: no range follows from it.");
  return found;
}

/** The derived columns of a record: regime and distance of what is adopted. */
function derived(found: Awaited<ReturnType<typeof adoptable>>, input: Input) {
  const prior = input.prior === "none" ? null : input.prior;
  try {
    const answer = distanceOf(found, priorOf(prior, input.priorScalePc));
    return {
      prior,
      priorScalePc: prior ? input.priorScalePc : null,
      priorReason: prior ? input.priorReason : null,
      regime: answer?.regime ?? null,
      distanceMethod: answer?.method ?? null,
      distancePc: answer?.pc?.value ?? null,
      distanceLowPc: answer?.pc?.low ?? null,
      distanceHighPc: answer?.pc?.high ?? null,
    };
  } catch (problem) {
    if (!(problem instanceof RangeError)) throw problem;
    throw new Invalid({ [prior ? "priorScalePc" : "measurementId"]: [problem.message] });
  }
}

/**
 * Makes one parallax the one that counts, with a reason and, where one is wanted, a prior with its reason. The one before
 * becomes superseded; a vetted record is a draft again. @throws Conflict, Invalid, NotFound
 */
export async function adoptParallax(actor: Actor | null, input: Input): Promise<void> {
  authorise(actor, "record.adopt");
  await change(actor, "catalogue.adopt-parallax", async (c) => {
    const opened = await openRecord(c, input.recordId);
    const found = await adoptable(c, input);
    const set = { adoptedParallaxId: found.id, adoptedReason: input.reason, ...derived(found, input) };
    const before = Object.fromEntries(Object.keys(set).map((key) => [key, opened[key as keyof typeof opened]]));
    if (JSON.stringify(before) === JSON.stringify(set)) return c.unchanged();
    if (opened.adoptedParallaxId && opened.adoptedParallaxId !== found.id) {
      await c.tx.update(measurement).set({ state: "superseded" }).where(eq(measurement.id, opened.adoptedParallaxId));
    }
    await c.tx.update(measurement).set({ state: "proposed" }).where(eq(measurement.id, found.id));
    const who = { adoptedBy: actor.personId, adoptedAt: new Date() };
    const states = { before, after: set, note: `Adopted ${found.rawText} ${found.unit}: ${input.reason}` };
    await closeRecord(c, opened, input.version, { ...set, ...who, ...UNVETTED }, states);
  });
}
