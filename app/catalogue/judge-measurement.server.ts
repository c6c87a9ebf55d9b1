import { eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { measurement } from "#app/database/schema/catalogue.ts";
import { Forbidden, Locked, NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { mayDo } from "#app/people/permissions.ts";
import type { ConfirmMeasurement, RejectMeasurement } from "./measurement-input.ts";
import { openRecord } from "./open-record.server.ts";
import { QUANTITY_FACTS } from "./quantities.ts";

async function openMeasurement(c: Change, measurementId: string) {
  const [found] = await c.tx.select().from(measurement).where(eq(measurement.id, measurementId));
  if (!found) throw new NotFound("There is no such measurement.");
  return { measurement: found, record: await openRecord(c, found.recordId) };
}

type Opened = Awaited<ReturnType<typeof openMeasurement>>;

function note(c: Change, { measurement: of, record }: Opened, after: object, said: string): void {
  c.audit({
    objectType: "record",
    objectId: record.id,
    objectName: record.name,
    before: { measurement: of.id, state: of.state, fromMemory: of.fromMemory },
    after: { measurement: of.id, ...after },
    note: `${QUANTITY_FACTS[of.quantity].label} ${of.rawText}: ${said}`,
  });
  c.touch({ type: "record", id: record.id });
}

/** A scientist judges any measurement; whoever entered one may take it back until it is vetted. */
export function mayReject(actor: Pick<Actor, "personId" | "roles">, of: { enteredBy: string; state: string }): boolean {
  return mayDo(actor.roles, "record.vet") || (of.enteredBy === actor.personId && of.state !== "vetted");
}

/** A scientist compares with its source what others entered from memory. */
export function mayConfirm(
  actor: Pick<Actor, "personId" | "roles">,
  of: { enteredBy: string; fromMemory: boolean; sourceId: string | null },
): boolean {
  return mayDo(actor.roles, "record.vet") && of.fromMemory && of.sourceId !== null && of.enteredBy !== actor.personId;
}

/**
 * Sets a measurement aside, with the reason; it stays readable.
 * @throws Forbidden for what others entered, unless a scientist asks; Locked while it is the adopted one
 */
export async function rejectMeasurement(actor: Actor | null, input: z.output<typeof RejectMeasurement>): Promise<void> {
  authorise(actor, "record.write");
  await change(actor, "catalogue.reject-measurement", async (c) => {
    const opened = await openMeasurement(c, input.measurementId);
    if (!mayReject(actor, opened.measurement)) {
      throw new Forbidden("Only a scientist sets aside what others entered, or what is vetted.");
    }
    if (opened.record.adoptedParallaxId === opened.measurement.id) {
      throw new Locked("This measurement is adopted. Adopt another one first.");
    }
    if (opened.measurement.state === "rejected") return c.unchanged();
    const set = { state: "rejected" as const, stateReason: input.reason };
    await compareAndSet(c.tx, measurement, opened.measurement.id, input.version, set);
    note(c, opened, set, input.reason);
  });
}

/**
 * A scientist has compared a value with its source: it is no longer from memory.
 * @throws Forbidden for a value one has entered oneself, Locked where no source is cited
 */
export async function confirmMeasurement(
  actor: Actor | null,
  input: z.output<typeof ConfirmMeasurement>,
): Promise<void> {
  authorise(actor, "record.vet");
  await change(actor, "catalogue.confirm-measurement", async (c) => {
    const opened = await openMeasurement(c, input.measurementId);
    const { measurement: of } = opened;
    if (of.enteredBy === actor.personId) {
      throw new Forbidden("You have entered this value yourself, so somebody else has to compare it with its source.");
    }
    if (!of.sourceId) throw new Locked("No source is cited, so there is nothing to compare it with.");
    if (!of.fromMemory) return c.unchanged();
    const words = [of.note, `Compared by ${actor.name}: ${input.reason}`].filter(Boolean).join(" ").slice(0, 1000);
    await compareAndSet(c.tx, measurement, of.id, input.version, { fromMemory: false, note: words });
    note(c, opened, { fromMemory: false }, input.reason);
  });
}
