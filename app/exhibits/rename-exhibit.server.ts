import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { authorise } from "#app/people/authorise.ts";
import type { RenameExhibit } from "./exhibit-input.ts";
import { noteContributor, openExhibit } from "./open-exhibit.server.ts";

export async function renameExhibit(actor: Actor | null, input: z.output<typeof RenameExhibit>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.rename", async (c) => {
    const found = await openExhibit(c, input.exhibitId);
    const before = { titleEn: found.titleEn, titleFr: found.titleFr };
    const after = { titleEn: input.titleEn, titleFr: input.titleFr };
    if (before.titleEn === after.titleEn && before.titleFr === after.titleFr) return c.unchanged();
    await compareAndSet(c.tx, exhibit, found.id, input.version, after);
    await noteContributor(c, found.id);
    c.audit({ objectType: "exhibit", objectId: found.id, objectName: after.titleEn, before, after });
    c.touch({ type: "exhibit", id: found.id });
  });
}
