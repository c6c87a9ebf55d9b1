import { eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { person, personRole } from "#app/database/schema/people.ts";
import { Locked } from "#app/errors.ts";
import type { FirstAdmin } from "./input.ts";
import { openInvited } from "./invite-person.server.ts";

/** Whoever may run programs on the server; there is nobody yet who could sign in. */
const OPERATOR: Actor = {
  personId: "",
  name: "The operator of this installation",
  email: "",
  roles: [],
  sessionId: null,
  requestId: "command line",
};

/**
 * Public, but reached from the command line alone (drizzle/first-admin.ts): invites the first administrator of a new
 * installation, who invites everybody else.
 * @throws Locked when there is an administrator already, Invalid
 */
export async function inviteFirstAdmin({ email, name }: z.output<typeof FirstAdmin>): Promise<string> {
  return openInvited(OPERATOR, "people.invite-first-admin", { email, name, roles: ["admin"] }, async (c) => {
    const admins = await c.tx
      .select({ state: person.state })
      .from(personRole)
      .innerJoin(person, eq(person.id, personRole.personId))
      .where(eq(personRole.role, "admin"))
      .for("update");
    if (admins.some(({ state }) => state === "active")) {
      throw new Locked("There is an active administrator already, who invites everybody else.");
    }
  });
}
