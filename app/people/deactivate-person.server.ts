import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { person } from "#app/database/schema/people.ts";
import { authorise } from "./authorise.ts";
import { endSessions } from "./end-sessions.server.ts";
import type { PersonAndVersion } from "./input.ts";
import { keepAnAdmin } from "./keep-an-admin.server.ts";
import { endLinks } from "./one-time-link.server.ts";
import { openPerson } from "./open-person.server.ts";

type Input = z.output<typeof PersonAndVersion>;

/** Closes an account and ends its sessions; what the person did stays theirs. @throws Locked, Conflict */
export async function deactivatePerson(actor: Actor | null, input: Input): Promise<void> {
  authorise(actor, "people.manage");
  await change(actor, "people.deactivate", async (c) => {
    const found = await openPerson(c, input.personId);
    if (found.state === "deactivated") return c.unchanged();
    if (found.state === "active" && found.roles.includes("admin")) await keepAnAdmin(c, found.id);
    await compareAndSet(c.tx, person, found.id, input.version, { state: "deactivated" });
    await endSessions(c, found.id);
    await endLinks(c, found.id);
    const states = { before: { state: found.state }, after: { state: "deactivated" } };
    c.audit({ objectType: "person", objectId: found.id, objectName: found.name, ...states });
  });
}

/** Opens a closed account again: active where a password was ever chosen, invited otherwise. @throws Conflict */
export async function reactivatePerson(actor: Actor | null, input: Input): Promise<void> {
  authorise(actor, "people.manage");
  await change(actor, "people.reactivate", async (c) => {
    const found = await openPerson(c, input.personId);
    if (found.state !== "deactivated") return c.unchanged();
    const state = found.passwordHash ? "active" : "invited";
    await compareAndSet(c.tx, person, found.id, input.version, { state });
    const states = { before: { state: found.state }, after: { state } };
    c.audit({ objectType: "person", objectId: found.id, objectName: found.name, ...states });
  });
}
