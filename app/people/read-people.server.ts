import { and, asc, desc, eq, gt, isNull } from "drizzle-orm";
import { type Actor, ROLES } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { person, personRole, session } from "#app/database/schema/people.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "./authorise.ts";
import { IDLE_MS } from "./session-limits.ts";

/** Everybody who has an account, by name. */
export async function readPeople(actor: Actor | null) {
  authorise(actor, "people.manage");
  const [people, roles] = await Promise.all([
    db()
      .select({ id: person.id, name: person.name, email: person.email, state: person.state, version: person.version })
      .from(person)
      .orderBy(asc(person.name)),
    db().select().from(personRole),
  ]);
  return people.map((one) => ({
    ...one,
    roles: ROLES.filter((role) => roles.some((row) => row.personId === one.id && row.role === role)),
  }));
}

/** @throws NotFound */
export async function readPerson(actor: Actor | null, personId: string) {
  authorise(actor, "people.manage");
  const found = (await readPeople(actor)).find((one) => one.id === personId);
  if (!found) throw new NotFound("There is no such person.");
  return found;
}

/** One's own account with its open sessions, newest first. */
export async function readAccount(actor: Actor | null) {
  authorise(actor, "account.use");
  const sessions = await db()
    .select()
    .from(session)
    .where(
      and(
        eq(session.personId, actor.personId),
        isNull(session.revokedAt),
        gt(session.expiresAt, new Date()),
        gt(session.lastSeenAt, new Date(Date.now() - IDLE_MS)),
      ),
    )
    .orderBy(desc(session.lastSeenAt));
  return {
    name: actor.name,
    email: actor.email,
    roles: actor.roles,
    sessions: sessions.map(({ id, address, userAgent, createdAt, lastSeenAt, expiresAt }) => ({
      id,
      address,
      userAgent,
      createdAt: createdAt.toISOString(),
      lastSeenAt: lastSeenAt.toISOString(),
      expiresAt: expiresAt.toISOString(),
      isThisOne: id === actor.sessionId,
    })),
  };
}
