import { and, eq, gt, isNull } from "drizzle-orm";
import type { MiddlewareFunction } from "react-router";
import type { Actor } from "#app/audit/actor.ts";
import { actorContext, requestIdContext } from "#app/context.server.ts";
import { db } from "#app/database/db.server.ts";
import { person, personRole, session } from "#app/database/schema/people.ts";
import { broken } from "#app/http.server.ts";
import { readSessionToken } from "./session-cookie.server.ts";
import { IDLE_MS, SEEN_EVERY_MS } from "./session-limits.ts";
import { tokenHash } from "./token.server.ts";

/** Who the cookie's token belongs to now, with today's roles; null when the session ended or the person left. */
export async function actorOfToken(token: string, requestId: string): Promise<Actor | null> {
  const now = Date.now();
  const rows = await db()
    .select({ session, person, role: personRole.role })
    .from(session)
    .innerJoin(person, eq(person.id, session.personId))
    .leftJoin(personRole, eq(personRole.personId, person.id))
    .where(
      and(
        eq(session.tokenHash, tokenHash(token)),
        isNull(session.revokedAt),
        gt(session.expiresAt, new Date(now)),
        gt(session.lastSeenAt, new Date(now - IDLE_MS)),
        eq(person.state, "active"),
      ),
    );
  const [first] = rows;
  if (!first) return null;
  if (now - first.session.lastSeenAt.getTime() > SEEN_EVERY_MS) {
    await db()
      .update(session)
      .set({ lastSeenAt: new Date(now) })
      .where(and(eq(session.id, first.session.id), isNull(session.revokedAt)));
  }
  return {
    personId: first.person.id,
    name: first.person.name,
    email: first.person.email,
    roles: rows.flatMap((row) => (row.role ? [row.role] : [])),
    sessionId: first.session.id,
    requestId,
  };
}

/** Addresses that answer everybody alike: they cost no look into the table, and stand when the database does not. */
const ASKS_NOBODY = /^\/(?:healthz|readyz|feed|stills|pictures|k|api)(?:[/.]|$)/;

/** Root middleware: puts the person of the session on the request. */
export const findSession: MiddlewareFunction<Response> = async ({ request, context }, next) => {
  const token = ASKS_NOBODY.test(new URL(request.url).pathname) ? null : await readSessionToken(request);
  if (token) {
    const actor = await actorOfToken(token, context.get(requestIdContext)).catch((error: unknown) => {
      throw broken(error, { context });
    });
    context.set(actorContext, actor);
  }
  return next();
};
