import { setTimeout as pause } from "node:timers/promises";
import { and, eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { db } from "#app/database/db.server.ts";
import { person } from "#app/database/schema/people.ts";
import type { RequestReset } from "./input.ts";
import { countAttempt } from "./limits.server.ts";
import { makeLink } from "./one-time-link.server.ts";
import { neighbourhood, type Visitor } from "./visitor.server.ts";

/** Longer than writing the mail down takes, so that the time of the answer does not tell who has an account. */
export const ANSWER_AFTER_MS = 250;

/** Public. Mails a link if there is such an active account; the answer is the same if there is none. @throws TooMany */
export async function requestReset(input: z.output<typeof RequestReset>, visitor: Visitor): Promise<void> {
  await countAttempt("reset-address", neighbourhood(visitor.address));
  await countAttempt("reset-account", input.email);
  await Promise.all([mailLink(input.email, visitor.requestId), pause(ANSWER_AFTER_MS)]);
}

async function mailLink(email: string, requestId: string): Promise<void> {
  const [found] = await db()
    .select()
    .from(person)
    .where(and(eq(person.email, email), eq(person.state, "active")));
  if (!found) return;
  const asker: Actor = { personId: "", name: "Somebody", email: "", roles: [], sessionId: null, requestId };
  await change(asker, "people.request-reset", async (c) => {
    const { url, lasts } = await makeLink(c, found.id, "password-reset");
    c.mail({
      to: found.email,
      subject: "A new password for Alidade",
      text: [
        `Dear ${found.name},`,
        `Somebody, we hope you, asked for a new password. The link works once, for ${lasts}:`,
        url,
        "If it was not you, do nothing: your password stays as it is.",
      ].join("\n\n"),
    });
    c.audit({ objectType: "person", objectId: found.id, objectName: found.name, note: "Asked for a new password" });
  });
}
