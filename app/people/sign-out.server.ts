import { eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { session } from "#app/database/schema/people.ts";
import { authorise } from "./authorise.ts";

/** Ends the session that asks. */
export async function signOut(actor: Actor | null): Promise<void> {
  authorise(actor, "account.use");
  const { sessionId } = actor;
  if (!sessionId) return;
  await change(actor, "people.sign-out", async (c) => {
    await c.tx.update(session).set({ revokedAt: new Date() }).where(eq(session.id, sessionId));
    c.audit({ objectType: "person", objectId: actor.personId, objectName: actor.name, note: "Signed out" });
  });
}
