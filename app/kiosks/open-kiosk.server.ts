import { eq } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { kiosk } from "#app/database/schema/kiosks.ts";
import { NotFound } from "#app/errors.ts";

/** @throws NotFound */
export async function openKiosk(c: Change, kioskId: string) {
  const [found] = await c.tx.select().from(kiosk).where(eq(kiosk.id, kioskId));
  if (!found) throw new NotFound("There is no such kiosk.");
  return found;
}
