import { and, eq, isNull } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { person, personRole, session } from "#app/database/schema/people.ts";
import { Invalid } from "#app/errors.ts";
import type { SignIn } from "./input.ts";
import { countAttempt, forgetAttempts, forgiveAttempt } from "./limits.server.ts";
import { passwordMatches } from "./password.server.ts";
import { ABSOLUTE_MS } from "./session-limits.ts";
import { newToken, tokenHash } from "./token.server.ts";
import { neighbourhood, type Visitor } from "./visitor.server.ts";

/** One sentence for a wrong address, a wrong password, an unanswered invitation and a closed account. */
const REFUSED = "The address and the password do not fit together.";

/**
 * Public. Checks the password and opens a new session with a new token.
 * @throws Invalid with the same words whatever is wrong, TooMany by account and by address
 */
export async function signIn(
  input: z.output<typeof SignIn>,
  visitor: Visitor,
): Promise<{ token: string; expiresAt: Date }> {
  await countAttempt("sign-in-address", neighbourhood(visitor.address));
  await countAttempt("sign-in-account", input.email);
  const [found] = await db().select().from(person).where(eq(person.email, input.email));
  const right = await passwordMatches(found?.passwordHash, input.password);
  if (!found || !right || found.state !== "active") throw new Invalid({ "": [REFUSED] });
  await forgetAttempts("sign-in-account", input.email);
  await forgiveAttempt("sign-in-address", neighbourhood(visitor.address));
  const roles = await db().select().from(personRole).where(eq(personRole.personId, found.id));
  const actor: Actor = {
    personId: found.id,
    name: found.name,
    email: found.email,
    roles: roles.map((row) => row.role),
    sessionId: null,
    requestId: visitor.requestId,
  };
  return openSession(actor, visitor, found.passwordHash);
}

/** A reset or a closing between the check and this moment wins: the row is locked and looked at again. */
async function stillStands(c: Change, checkedHash: string | null): Promise<void> {
  const [now] = await c.tx
    .select({ state: person.state, passwordHash: person.passwordHash })
    .from(person)
    .where(eq(person.id, c.actor.personId))
    .for("update");
  if (now?.state !== "active" || now.passwordHash !== checkedHash) throw new Invalid({ "": [REFUSED] });
}

/** Nobody is left signed in by a cookie that this browser has lost. */
async function endReplaced(c: Change, sessionId: string | null): Promise<void> {
  if (!sessionId) return;
  await c.tx
    .update(session)
    .set({ revokedAt: new Date() })
    .where(and(eq(session.id, sessionId), isNull(session.revokedAt)));
}

async function openSession(
  actor: Actor,
  visitor: Visitor,
  checkedHash: string | null,
): Promise<{ token: string; expiresAt: Date }> {
  const token = newToken();
  const now = new Date();
  const expiresAt = new Date(now.getTime() + ABSOLUTE_MS);
  await change(actor, "people.sign-in", async (c) => {
    await stillStands(c, checkedHash);
    await endReplaced(c, visitor.sessionId);
    await c.tx.insert(session).values({
      id: newId(),
      tokenHash: tokenHash(token),
      personId: actor.personId,
      lastSeenAt: now,
      expiresAt,
      address: visitor.address.slice(0, 64),
      userAgent: visitor.userAgent.slice(0, 400),
    });
    c.audit({ objectType: "person", objectId: actor.personId, objectName: actor.name, note: "Signed in" });
  });
  return { token, expiresAt };
}
