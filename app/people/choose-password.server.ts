import { eq, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { type Change, change } from "#app/audit/change.server.ts";
import type { LinkPurpose } from "#app/database/enums.ts";
import { person } from "#app/database/schema/people.ts";
import { Invalid } from "#app/errors.ts";
import { endSessions } from "./end-sessions.server.ts";
import type { ChoosePassword } from "./input.ts";
import { endLinks, readLink, spendLink } from "./one-time-link.server.ts";
import { openPerson } from "./open-person.server.ts";
import { hashPassword } from "./password.server.ts";

/** @throws Invalid when the password is the person's own name or address */
export function refuseOwnName(password: string, of: { name: string; email: string }): void {
  const plain = password.trim().toLowerCase();
  if (plain !== of.name.toLowerCase() && plain !== of.email.toLowerCase()) return;
  throw new Invalid({ password: ["Your own name or address is guessed first. Choose another."] });
}

/** What both links do: use the link up, set the password, end every session. */
async function choose(purpose: LinkPurpose, verb: string, input: Input, requestId: string): Promise<void> {
  const whose = await readLink(input.token, purpose);
  refuseOwnName(input.password, whose);
  const passwordHash = await hashPassword(input.password);
  await change(byLink(requestId), verb, async (c) => {
    const personId = await spendLink(c, input.token, purpose);
    const found = await openPerson(c, personId);
    await c.tx
      .update(person)
      .set({
        passwordHash,
        state: found.state === "invited" ? "active" : found.state,
        version: sql`${person.version} + 1`,
      })
      .where(eq(person.id, personId));
    await endLinks(c, personId);
    await endSessions(c, personId);
    note(c, found, purpose);
  });
}

function note(c: Change, whose: { id: string; name: string; state: string }, purpose: LinkPurpose): void {
  c.audit({
    objectType: "person",
    objectId: whose.id,
    objectName: whose.name,
    before: { state: whose.state },
    after: { state: whose.state === "invited" ? "active" : whose.state },
    note: purpose === "invitation" ? "Answered the invitation" : "Chose a new password by the link in the mail",
  });
}

/** Nobody is signed in when a link is followed; the audit row names the link's owner as its object. */
const byLink = (requestId: string): Actor => ({
  personId: "",
  name: "By the link in the mail",
  email: "",
  roles: [],
  sessionId: null,
  requestId,
});

type Input = z.output<typeof ChoosePassword>;

/** Public, by the link in the mail. @throws NotFound when the link is spent, Invalid */
export async function acceptInvitation(input: Input, requestId: string): Promise<void> {
  await choose("invitation", "people.accept-invitation", input, requestId);
}

/** Public, by the link in the mail. @throws NotFound when the link is spent, Invalid */
export async function resetPassword(input: Input, requestId: string): Promise<void> {
  await choose("password-reset", "people.reset-password", input, requestId);
}
