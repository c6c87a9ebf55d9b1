import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { session } from "#app/database/schema/people.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "./authorise.ts";
import type { RevokeSession } from "./input.ts";

/** Ends one of one's own sessions. @throws NotFound for anybody else's */
export async function revokeSession(actor: Actor | null, input: z.output<typeof RevokeSession>): Promise<void> {
  authorise(actor, "account.use");
  await change(actor, "people.revoke-session", async (c) => {
    const own = and(eq(session.id, input.sessionId), eq(session.personId, actor.personId));
    const [found] = await c.tx.select().from(session).where(own);
    if (!found) throw new NotFound("There is no such session of yours.");
    if (found.revokedAt) return c.unchanged();
    await c.tx
      .update(session)
      .set({ revokedAt: new Date() })
      .where(and(own, isNull(session.revokedAt)));
    const note = `Ended the session from ${found.address || "an unknown address"}`;
    c.audit({ objectType: "person", objectId: actor.personId, objectName: actor.name, note });
  });
}
