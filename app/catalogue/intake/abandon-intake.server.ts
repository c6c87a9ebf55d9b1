import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { db } from "#app/database/db.server.ts";
import { intake } from "#app/database/schema/catalogue.ts";
import { Locked } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { openIntake } from "./open-intake.server.ts";

/** Gives an intake up; nothing of it was in the catalogue. @throws Locked once it was applied */
export async function abandonIntake(actor: Actor | null, input: { intakeId: string; version: number }): Promise<void> {
  authorise(actor, "intake.write");
  const { intake: found } = await openIntake(db(), input.intakeId);
  await change(actor, "intake.abandon", async (c) => {
    if (found.state === "applied") throw new Locked("This table is in the catalogue already.");
    if (found.state === "abandoned") return c.unchanged();
    await compareAndSet(c.tx, intake, input.intakeId, input.version, { state: "abandoned" });
    const states = { before: { state: found.state }, after: { state: "abandoned" } };
    c.audit({ objectType: "intake", objectId: found.id, objectName: found.fileName, ...states });
  });
}
