import { eq } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { person, personRole } from "#app/database/schema/people.ts";
import { NotFound } from "#app/errors.ts";

/** @throws NotFound */
export async function openPerson(c: Pick<Change, "tx">, personId: string) {
  const [found] = await c.tx.select().from(person).where(eq(person.id, personId));
  if (!found) throw new NotFound("There is no such person.");
  const roles = await c.tx.select().from(personRole).where(eq(personRole.personId, personId));
  return { ...found, roles: roles.map((row) => row.role) };
}
