import { and, desc, eq, inArray, isNull } from "drizzle-orm";
import type { Role } from "#app/audit/actor.ts";
import type { Reader } from "#app/database/db.server.ts";
import { exhibitContributor } from "#app/database/schema/exhibits.ts";
import { person, personRole } from "#app/database/schema/people.ts";
import { seal } from "#app/database/schema/review.ts";

/** Persons whose hand is in the content of an exhibit. */
export async function readContributors(reader: Reader, exhibitId: string) {
  return reader
    .select({ personId: person.id, name: person.name, email: person.email })
    .from(exhibitContributor)
    .innerJoin(person, eq(person.id, exhibitContributor.personId))
    .where(eq(exhibitContributor.exhibitId, exhibitId));
}

/** The seals that hold, newest first. */
export async function readStandingSeals(reader: Reader, exhibitId: string) {
  return reader
    .select()
    .from(seal)
    .where(and(eq(seal.exhibitId, exhibitId), isNull(seal.voidedAt)))
    .orderBy(desc(seal.id));
}

/** Active people of a role, except those whose work it is: whom a hand-over is told to. */
export async function readPeopleOfRole(reader: Reader, role: Role, except: string[]) {
  const rows = await reader
    .select({ personId: person.id, name: person.name, email: person.email })
    .from(personRole)
    .innerJoin(person, eq(person.id, personRole.personId))
    .where(and(eq(personRole.role, role), eq(person.state, "active")));
  return rows.filter((row) => !except.includes(row.personId));
}

export async function readPersons(reader: Reader, personIds: string[]) {
  if (personIds.length === 0) return [];
  return reader
    .select({ personId: person.id, name: person.name, email: person.email })
    .from(person)
    .where(and(inArray(person.id, personIds), eq(person.state, "active")));
}
