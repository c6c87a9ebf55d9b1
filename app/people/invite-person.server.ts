import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import { duplicateKey } from "#app/database/database-error.ts";
import { newId } from "#app/database/new-id.ts";
import { person, personRole } from "#app/database/schema/people.ts";
import { Invalid, Locked } from "#app/errors.ts";
import { authorise } from "./authorise.ts";
import type { InvitePerson, PersonAndVersion } from "./input.ts";
import { makeLink } from "./one-time-link.server.ts";
import { openPerson } from "./open-person.server.ts";

type Invited = z.output<typeof InvitePerson>;

async function mailInvitation(c: Change, to: { id: string; name: string; email: string }): Promise<void> {
  const { url, lasts } = await makeLink(c, to.id, "invitation");
  c.mail({
    to: to.email,
    subject: "You are invited to Alidade",
    text: [
      `Dear ${to.name},`,
      `${c.actor.name} has opened an account for you in Alidade, the working tool of the content team.`,
      `Choose your password here; the link works once, for ${lasts}:`,
      url,
    ].join("\n\n"),
  });
}

/** @throws Invalid at `email` when somebody has this address already */
export async function invitePerson(actor: Actor | null, input: Invited): Promise<string> {
  authorise(actor, "people.manage");
  return openInvited(actor, "people.invite", input);
}

/** The work of it, for those who have asked who may. `allowed` is looked at inside the transaction. */
export async function openInvited(
  actor: Actor,
  verb: string,
  { email, name, roles }: Invited,
  allowed: (c: Change) => Promise<void> = async () => {},
): Promise<string> {
  const personId = newId();
  try {
    await change(actor, verb, async (c) => {
      await allowed(c);
      await c.tx.insert(person).values({ id: personId, email, name, state: "invited" });
      await c.tx.insert(personRole).values(roles.map((role) => ({ personId, role })));
      await mailInvitation(c, { id: personId, name, email });
      c.audit({ objectType: "person", objectId: personId, objectName: name, after: { email, name, roles } });
    });
  } catch (error) {
    if (duplicateKey(error) !== "person_email") throw error;
    throw new Invalid({ email: ["Somebody has this address already."] });
  }
  return personId;
}

/** Sends a fresh link to somebody who has not answered yet; the older one ends. @throws Locked */
export async function inviteAgain(actor: Actor | null, input: z.output<typeof PersonAndVersion>): Promise<void> {
  authorise(actor, "people.manage");
  await change(actor, "people.invite-again", async (c) => {
    const found = await openPerson(c, input.personId);
    if (found.state !== "invited") throw new Locked("This person has answered the invitation already.");
    await mailInvitation(c, found);
    c.audit({ objectType: "person", objectId: found.id, objectName: found.name, note: "Invited again" });
  });
}
