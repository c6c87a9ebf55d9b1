import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { db } from "#app/database/db.server.ts";
import { intake } from "#app/database/schema/catalogue.ts";
import { Locked } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireSource } from "../require-source.server.ts";
import { mappingFromForm } from "./mapping.ts";
import { openIntake } from "./open-intake.server.ts";

/** What the columns mean, as a person corrected it. @throws Invalid at each field, Conflict, Locked once applied */
export async function saveMapping(
  actor: Actor | null,
  intakeId: string,
  version: number,
  form: FormData,
): Promise<void> {
  authorise(actor, "intake.write");
  const opened = await openIntake(db(), intakeId);
  const after = mappingFromForm(form, opened.table.columns);
  await change(actor, "intake.save-mapping", async (c) => {
    if (opened.intake.state !== "uploaded") throw new Locked("This table was dealt with already.");
    const { sourceId } = after.options;
    await requireSource(c, "sourceId", sourceId);
    if (JSON.stringify(opened.mapping) === JSON.stringify(after)) return c.unchanged();
    await compareAndSet(c.tx, intake, intakeId, version, { mapping: after, sourceId });
    c.audit({
      objectType: "intake",
      objectId: intakeId,
      objectName: opened.intake.fileName,
      before: opened.mapping,
      after,
    });
  });
}
