import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { kiosk } from "#app/database/schema/kiosks.ts";
import { authorise } from "#app/people/authorise.ts";
import type { EditKiosk } from "./kiosk-input.ts";
import { openKiosk } from "./open-kiosk.server.ts";

export async function editKiosk(actor: Actor | null, input: z.output<typeof EditKiosk>): Promise<void> {
  authorise(actor, "kiosk.manage");
  await change(actor, "kiosk.edit", async (c) => {
    const found = await openKiosk(c, input.kioskId);
    const { name, station, language, idleSeconds } = input;
    const after = { name, station, language, idleSeconds };
    const before = {
      name: found.name,
      station: found.station,
      language: found.language,
      idleSeconds: found.idleSeconds,
    };
    if (JSON.stringify(before) === JSON.stringify(after)) return c.unchanged();
    await compareAndSet(c.tx, kiosk, found.id, input.version, after);
    c.audit({ objectType: "kiosk", objectId: found.id, objectName: name, before, after });
  });
}
