import { and, eq, isNull, ne } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { session } from "#app/database/schema/people.ts";

/** Ends every open session of a person, but for the one given. */
export async function endSessions(c: Change, personId: string, except = ""): Promise<void> {
  await c.tx
    .update(session)
    .set({ revokedAt: new Date() })
    .where(and(eq(session.personId, personId), isNull(session.revokedAt), ne(session.id, except)));
}
