import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { duplicateKey } from "#app/database/database-error.ts";
import { newId } from "#app/database/new-id.ts";
import { kiosk } from "#app/database/schema/kiosks.ts";
import { Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import type { CreateKiosk } from "./kiosk-input.ts";

/** @throws Invalid at `slug` when another kiosk has this address. */
export async function createKiosk(actor: Actor | null, input: z.output<typeof CreateKiosk>): Promise<string> {
  authorise(actor, "kiosk.manage");
  const kioskId = newId();
  try {
    await change(actor, "kiosk.create", async (c) => {
      await c.tx.insert(kiosk).values({ id: kioskId, ...input });
      c.audit({ objectType: "kiosk", objectId: kioskId, objectName: input.name, after: input });
    });
  } catch (error) {
    if (duplicateKey(error) !== "kiosk_slug") throw error;
    throw new Invalid({ slug: ["Another kiosk has this address already. Choose another."] });
  }
  return kioskId;
}
