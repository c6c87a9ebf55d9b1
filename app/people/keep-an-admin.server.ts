import { and, eq } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { person, personRole } from "#app/database/schema/people.ts";
import { Locked } from "#app/errors.ts";

/**
 * Refuses what would leave the house without an active administrator. The rows are locked, so that two administrators
 * who dismiss each other at once wait for each other and one of them is refused.
 * @throws Locked
 */
export async function keepAnAdmin(c: Change, leaving: string): Promise<void> {
  const admins = await c.tx
    .select({ personId: person.id })
    .from(personRole)
    .innerJoin(person, eq(person.id, personRole.personId))
    .where(and(eq(personRole.role, "admin"), eq(person.state, "active")))
    .for("update");
  if (admins.some((admin) => admin.personId !== leaving)) return;
  throw new Locked("This is the last active administrator. Make somebody else one first.");
}
