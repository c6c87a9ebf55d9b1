import { eq, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { person } from "#app/database/schema/people.ts";
import { Invalid } from "#app/errors.ts";
import { authorise } from "./authorise.ts";
import { refuseOwnName } from "./choose-password.server.ts";
import { endSessions } from "./end-sessions.server.ts";
import type { ChangePassword } from "./input.ts";
import { countAttempt } from "./limits.server.ts";
import { endLinks } from "./one-time-link.server.ts";
import { openPerson } from "./open-person.server.ts";
import { hashPassword, passwordMatches } from "./password.server.ts";

/** One's own password; every other session of one's own ends. @throws Invalid, TooMany */
export async function changePassword(actor: Actor | null, input: z.output<typeof ChangePassword>): Promise<void> {
  authorise(actor, "account.use");
  await countAttempt("sign-in-account", actor.email);
  refuseOwnName(input.password, actor);
  const passwordHash = await hashPassword(input.password);
  await change(actor, "people.change-password", async (c) => {
    const found = await openPerson(c, actor.personId);
    if (!(await passwordMatches(found.passwordHash, input.current))) {
      throw new Invalid({ current: ["This is not your present password."] });
    }
    await c.tx
      .update(person)
      .set({ passwordHash, version: sql`${person.version} + 1` })
      .where(eq(person.id, found.id));
    await endLinks(c, found.id);
    await endSessions(c, found.id, actor.sessionId ?? "");
    c.audit({ objectType: "person", objectId: found.id, objectName: found.name, note: "Changed the password" });
  });
}
