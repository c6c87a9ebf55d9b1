import { eq } from "drizzle-orm";
import { db } from "#app/database/db.server.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { publishEdition } from "#app/editions/publish-edition.server.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { assignKiosk } from "#app/kiosks/assign-kiosk.server.ts";
import { createKiosk } from "#app/kiosks/create-kiosk.server.ts";
import { approveExhibit } from "#app/review/approve-exhibit.server.ts";
import { sealable } from "#app/review/digest.server.ts";
import { submitExhibit } from "#app/review/submit-exhibit.server.ts";
import { verifyExhibit } from "#app/review/verify-exhibit.server.ts";
import type { Team } from "./accounts.ts";

/** The slug of the demo's kiosk: its page is /k/entrance. */
export const DEMO_KIOSK = "entrance";

/** What a person who signs has on the screen. */
async function asSeen(exhibitId: string) {
  const [found] = await db().select().from(exhibit).where(eq(exhibit.id, exhibitId));
  const { digest } = sealable(await resolveExhibit(db(), exhibitId));
  return { exhibitId, version: found?.version ?? 0, digest, note: null };
}

/** Takes an exhibit through every hand to its first edition, and puts it on the demo's kiosk. */
export async function release(team: Team, exhibitId: string): Promise<void> {
  await submitExhibit(team.curator, await asSeen(exhibitId));
  await verifyExhibit(team.secondScientist, await asSeen(exhibitId));
  await approveExhibit(team.publisher, await asSeen(exhibitId));
  await publishEdition(team.publisher, await asSeen(exhibitId));
  const kioskId = await createKiosk(team.admin, {
    slug: DEMO_KIOSK,
    name: "Entrance hall",
    station: "Lighthouse Gallery, beside the stairs",
    language: "en",
    idleSeconds: 60,
  });
  await assignKiosk(team.publisher, { kioskId, version: 1, exhibitId });
}
