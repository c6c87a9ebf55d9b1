import { eq } from "drizzle-orm";
import type { z } from "zod";
import { type Actor, ROLES } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { person, personRole } from "#app/database/schema/people.ts";
import { authorise } from "./authorise.ts";
import type { ChangeRoles } from "./input.ts";
import { keepAnAdmin } from "./keep-an-admin.server.ts";
import { openPerson } from "./open-person.server.ts";

/** Roles count from the person's next request on. @throws Locked for the last active administrator, Conflict */
export async function changeRoles(actor: Actor | null, input: z.output<typeof ChangeRoles>): Promise<void> {
  authorise(actor, "people.manage");
  await change(actor, "people.change-roles", async (c) => {
    const found = await openPerson(c, input.personId);
    const before = ROLES.filter((role) => found.roles.includes(role));
    const after = ROLES.filter((role) => input.roles.includes(role));
    if (before.join() === after.join()) return c.unchanged();
    if (found.state === "active" && before.includes("admin") && !after.includes("admin"))
      await keepAnAdmin(c, found.id);
    await compareAndSet(c.tx, person, found.id, input.version, {});
    await c.tx.delete(personRole).where(eq(personRole.personId, found.id));
    await c.tx.insert(personRole).values(after.map((role) => ({ personId: found.id, role })));
    c.audit({
      objectType: "person",
      objectId: found.id,
      objectName: found.name,
      before: { roles: before },
      after: { roles: after },
    });
  });
}
