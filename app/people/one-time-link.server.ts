import { and, eq, gt, isNull } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { db } from "#app/database/db.server.ts";
import type { LinkPurpose, PersonState } from "#app/database/enums.ts";
import { newId } from "#app/database/new-id.ts";
import { oneTimeLink, person } from "#app/database/schema/people.ts";
import { env } from "#app/env.server.ts";
import { NotFound } from "#app/errors.ts";
import { newToken, tokenHash } from "./token.server.ts";

const HOUR = 3_600_000;
const LIFETIME: Record<LinkPurpose, { ms: number; words: string; path: string }> = {
  invitation: { ms: 7 * 24 * HOUR, words: "seven days", path: "invitation" },
  "password-reset": { ms: HOUR, words: "one hour", path: "reset-password" },
};

const SPENT = "This link was used already, has expired, or was replaced by a newer one.";

/** The account for which a link of either purpose still says something. */
const WAITING: Record<LinkPurpose, PersonState> = { invitation: "invited", "password-reset": "active" };

/** Ends what links a person still has: a newer one is on its way, or the account or its password changed. */
export async function endLinks(c: Pick<Change, "tx">, personId: string): Promise<void> {
  await c.tx
    .update(oneTimeLink)
    .set({ usedAt: new Date() })
    .where(and(eq(oneTimeLink.personId, personId), isNull(oneTimeLink.usedAt)));
}

/** A new link for a person; older ones end. Only its hash is kept. */
export async function makeLink(c: Change, personId: string, purpose: LinkPurpose) {
  const now = new Date();
  await endLinks(c, personId);
  const token = newToken();
  const { ms, words, path } = LIFETIME[purpose];
  const expiresAt = new Date(now.getTime() + ms);
  await c.tx.insert(oneTimeLink).values({ id: newId(), tokenHash: tokenHash(token), personId, purpose, expiresAt });
  return { url: `${env().PUBLIC_URL}/${path}/${token}`, lasts: words };
}

function usable(token: string, purpose: LinkPurpose) {
  return and(
    eq(oneTimeLink.tokenHash, tokenHash(token)),
    eq(oneTimeLink.purpose, purpose),
    isNull(oneTimeLink.usedAt),
    gt(oneTimeLink.expiresAt, new Date()),
    eq(person.state, WAITING[purpose]),
  );
}

/** Whose link it is, for showing the form; looking does not use it up. @throws NotFound */
export async function readLink(token: string, purpose: LinkPurpose) {
  const [found] = await db()
    .select({ name: person.name, email: person.email })
    .from(oneTimeLink)
    .innerJoin(person, eq(person.id, oneTimeLink.personId))
    .where(usable(token, purpose));
  if (!found) throw new NotFound(SPENT);
  return found;
}

/** Uses a link up; of two clicks at once, one. @throws NotFound */
export async function spendLink(c: Pick<Change, "tx">, token: string, purpose: LinkPurpose): Promise<string> {
  const [found] = await c.tx
    .select({ id: oneTimeLink.id, personId: oneTimeLink.personId })
    .from(oneTimeLink)
    .innerJoin(person, eq(person.id, oneTimeLink.personId))
    .where(usable(token, purpose));
  if (!found) throw new NotFound(SPENT);
  const [spent] = await c.tx
    .update(oneTimeLink)
    .set({ usedAt: new Date() })
    .where(and(eq(oneTimeLink.id, found.id), isNull(oneTimeLink.usedAt)));
  if (spent.affectedRows !== 1) throw new NotFound(SPENT);
  return found.personId;
}
