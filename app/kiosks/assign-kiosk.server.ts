import { eq, inArray } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { edition } from "#app/database/schema/editions.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { kiosk } from "#app/database/schema/kiosks.ts";
import { Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import type { AssignKiosk } from "./kiosk-input.ts";
import { openKiosk } from "./open-kiosk.server.ts";

/**
 * Says which exhibit a kiosk shows.
 * @throws Invalid at `exhibitId` when nothing of it was published: a kiosk is never blank.
 */
export async function assignKiosk(actor: Actor | null, input: z.output<typeof AssignKiosk>): Promise<void> {
  authorise(actor, "kiosk.assign");
  await change(actor, "kiosk.assign", async (c) => {
    const found = await openKiosk(c, input.kioskId);
    const { exhibitId } = input;
    if (found.exhibitId === exhibitId) return c.unchanged();
    const ids = [found.exhibitId, exhibitId].filter((id) => id !== null);
    const exhibits = ids.length > 0 ? await c.tx.select().from(exhibit).where(inArray(exhibit.id, ids)) : [];
    const title = (id: string | null) => exhibits.find((one) => one.id === id)?.titleEn ?? null;
    if (exhibitId) {
      if (title(exhibitId) === null) throw new Invalid({ exhibitId: ["There is no such exhibit."] });
      const [published] = await c.tx
        .select({ id: edition.id })
        .from(edition)
        .where(eq(edition.exhibitId, exhibitId))
        .limit(1);
      if (!published) throw new Invalid({ exhibitId: ["Nothing of this exhibit is published yet."] });
    }
    await compareAndSet(c.tx, kiosk, found.id, input.version, { exhibitId });
    c.audit({
      objectType: "kiosk",
      objectId: found.id,
      objectName: found.name,
      before: { exhibit: title(found.exhibitId) },
      after: { exhibit: title(exhibitId) },
    });
  });
}
