import { asc, eq } from "drizzle-orm";
import type { Actor, Role } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { outbox } from "#app/database/schema/jobs.ts";
import { person } from "#app/database/schema/people.ts";
import { hashPassword } from "#app/people/password.server.ts";
import type { Visitor } from "#app/people/visitor.server.ts";
import { makeActor } from "./person.ts";

export const PASSWORD = "a tern above the estuary";

/** A new person with these roles who can sign in with PASSWORD. */
export async function makeMember(...roles: Role[]): Promise<Actor> {
  const actor = await makeActor(...roles);
  const passwordHash = await hashPassword(PASSWORD);
  await db().update(person).set({ passwordHash }).where(eq(person.id, actor.personId));
  return actor;
}

let visits = 0;

/** Somebody from an address of their own, so that limits do not carry over from one test to the next. */
export function makeVisitor(): Visitor {
  visits += 1;
  return { address: `10.0.0.${visits}`, userAgent: "test", requestId: "r", sessionId: null };
}

/** The token in the newest mail to an address; "" where none was written. */
export async function newestToken(email: string): Promise<string> {
  const rows = await db().select().from(outbox).orderBy(asc(outbox.id));
  const mails = rows.map((row) => row.payload as { to: string; text: string }).filter((mail) => mail.to === email);
  return mails.at(-1)?.text.match(/\/(?:invitation|reset-password)\/(\S+)/)?.[1] ?? "";
}
