import type { Actor, Role } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { person, personRole } from "#app/database/schema/people.ts";

/** An active person with roles, straight into the database; no password, so nobody can sign in as them. */
export async function makePerson(overrides: Partial<typeof person.$inferInsert> & { roles?: Role[] } = {}) {
  const { roles = [], ...columns } = overrides;
  const id = newId();
  const row = {
    id,
    name: `Person ${id}`,
    email: `${id.toLowerCase()}@tern.example`,
    state: "active" as const,
    ...columns,
  };
  await db().insert(person).values(row);
  if (roles.length > 0)
    await db()
      .insert(personRole)
      .values(roles.map((role) => ({ personId: row.id, role })));
  return { ...row, roles };
}

/** Somebody who may act: a new person with these roles. */
export async function makeActor(...roles: Role[]): Promise<Actor> {
  const made = await makePerson({ roles });
  return { personId: made.id, name: made.name, email: made.email, roles, sessionId: null, requestId: "test" };
}
