import { eq } from "drizzle-orm";
import { afterEach, expect, test, vi } from "vitest";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { outbox } from "#app/database/schema/jobs.ts";
import { oneTimeLink, person, session } from "#app/database/schema/people.ts";
import { Conflict, Forbidden, Invalid, Locked, NotFound, TooMany, Unauthenticated } from "#app/errors.ts";
import { makeActor, makePerson } from "#tests/factories/person.ts";
import { changePassword } from "./change-password.server.ts";
import { changeRoles } from "./change-roles.server.ts";
import { acceptInvitation, resetPassword } from "./choose-password.server.ts";
import { deactivatePerson, reactivatePerson } from "./deactivate-person.server.ts";
import { actorOfToken } from "./find-session.server.ts";
import { inviteFirstAdmin } from "./invite-first-admin.server.ts";
import { inviteAgain, invitePerson } from "./invite-person.server.ts";
import * as passwords from "./password.server.ts";
import { hashPassword } from "./password.server.ts";
import { readAccount } from "./read-people.server.ts";
import { ANSWER_AFTER_MS, requestReset } from "./request-reset.server.ts";
import { revokeSession } from "./revoke-session.server.ts";
import { ABSOLUTE_MS, IDLE_MS, SEEN_EVERY_MS } from "./session-limits.ts";
import { signIn } from "./sign-in.server.ts";
import { signOut } from "./sign-out.server.ts";

const PASSWORD = "a tern above the estuary";
afterEach(() => vi.restoreAllMocks());
let visits = 0;
/** Each test comes from an address of its own, so that limits do not carry over. */
const visitor = () => {
  visits += 1;
  return { address: `10.0.0.${visits}`, userAgent: "test", requestId: "r", sessionId: null };
};
const member = async (...roles: Parameters<typeof makeActor>) => {
  const passwordHash = await hashPassword(PASSWORD);
  const actor = await makeActor(...roles);
  await db().update(person).set({ passwordHash }).where(eq(person.id, actor.personId));
  return actor;
};
/** The link in the newest mail to an address. */
const linkTo = async (email: string) => {
  const rows = await db().select().from(outbox);
  const mails = rows.map((row) => row.payload as { to: string; text: string }).filter((mail) => mail.to === email);
  return mails.at(-1)?.text.match(/\/(?:invitation|reset-password)\/(\S+)/)?.[1] ?? "";
};

test("signing in gives a new token each time, and only its hash is kept", async () => {
  const actor = await member("editor");
  const one = await signIn({ email: actor.email, password: PASSWORD }, visitor());
  const two = await signIn({ email: actor.email, password: PASSWORD }, visitor());
  expect(one.token).not.toBe(two.token);
  const rows = await db().select().from(session).where(eq(session.personId, actor.personId));
  expect(rows).toHaveLength(2);
  expect(JSON.stringify(rows)).not.toContain(one.token);
  expect(await actorOfToken(one.token, "r")).toMatchObject({ personId: actor.personId, roles: ["editor"] });
});

test("a wrong address, a wrong password, an invited and a closed account are refused in the same words", async () => {
  const actor = await member("editor");
  const invited = await makePerson({ state: "invited" });
  const closed = await member();
  await db().update(person).set({ state: "deactivated" }).where(eq(person.id, closed.personId));
  const said = new Set<string>();
  for (const [email, password] of [
    ["nobody@tern.example", PASSWORD],
    [actor.email, "wrong"],
    [invited.email, PASSWORD],
    [closed.email, PASSWORD],
  ] as const) {
    const refusal = await signIn({ email, password }, visitor()).catch((error: Error) => error);
    expect(refusal).toBeInstanceOf(Invalid);
    said.add((refusal as Error).message);
  }
  expect(said.size).toBe(1);
});

test("attempts are limited by account, whether it exists or not", async () => {
  const actor = await member("editor");
  for (const email of [actor.email, "ghost@tern.example"]) {
    const outcomes: unknown[] = [];
    for (let attempt = 0; attempt < 11; attempt += 1) {
      outcomes.push(await signIn({ email, password: "wrong" }, visitor()).catch((error) => error.constructor));
    }
    expect(outcomes.slice(0, 10).every((outcome) => outcome === Invalid)).toBe(true);
    expect(outcomes[10]).toBe(TooMany);
  }
});

test("attempts are limited by address", async () => {
  const here = visitor();
  let refused: unknown;
  for (let attempt = 0; attempt < 61; attempt += 1) {
    const email = `guess-${attempt}@tern.example`;
    refused = await signIn({ email, password: "x" }, here).catch((error) => error);
  }
  expect(refused).toBeInstanceOf(TooMany);
  expect((refused as TooMany).retryAfterSeconds).toBeGreaterThan(0);
});

test("people who sign in rightly do not use up the attempts of the address they share", async () => {
  const actor = await member("editor");
  const here = visitor();
  for (let time = 0; time < 61; time += 1) {
    // Comparing is slow on purpose; that the password is right is not what is asked here.
    vi.spyOn(passwords, "passwordMatches").mockResolvedValueOnce(true);
    await signIn({ email: actor.email, password: PASSWORD }, here);
  }
});

test("a session ends when idle, when old, when revoked, and when signed out", async () => {
  const actor = await member("editor");
  const open = async () => {
    const { token } = await signIn({ email: actor.email, password: PASSWORD }, visitor());
    const found = await actorOfToken(token, "r");
    return { token, sessionId: found?.sessionId ?? "", actor: found };
  };
  const idle = await open();
  await db()
    .update(session)
    .set({ lastSeenAt: new Date(Date.now() - IDLE_MS - 1000) })
    .where(eq(session.id, idle.sessionId));
  expect(await actorOfToken(idle.token, "r")).toBeNull();
  const old = await open();
  await db()
    .update(session)
    .set({ expiresAt: new Date(Date.now() - 1000) })
    .where(eq(session.id, old.sessionId));
  expect(await actorOfToken(old.token, "r")).toBeNull();
  const revoked = await open();
  expect((await readAccount(actor)).sessions.map((one) => one.id)).toEqual([revoked.sessionId]);
  await revokeSession(actor, { sessionId: revoked.sessionId });
  expect(await actorOfToken(revoked.token, "r")).toBeNull();
  const left = await open();
  await signOut(left.actor);
  expect(await actorOfToken(left.token, "r")).toBeNull();
  expect(ABSOLUTE_MS).toBeGreaterThan(IDLE_MS);
});

test("nobody ends somebody else's session", async () => {
  const [one, other] = [await member("editor"), await member("admin")];
  const { token } = await signIn({ email: one.email, password: PASSWORD }, visitor());
  const found = await actorOfToken(token, "r");
  await expect(revokeSession(other, { sessionId: found?.sessionId ?? "" })).rejects.toBeInstanceOf(NotFound);
  expect(await actorOfToken(token, "r")).not.toBeNull();
});

test("an invitation works once, and lets its person in", async () => {
  const admin = await makeActor("admin");
  const email = "ines@tern.example";
  const personId = await invitePerson(admin, { email, name: "Ines", roles: ["editor", "publisher"] });
  const token = await linkTo(email);
  await acceptInvitation({ token, password: PASSWORD, again: PASSWORD }, "r");
  await expect(acceptInvitation({ token, password: PASSWORD, again: PASSWORD }, "r")).rejects.toBeInstanceOf(NotFound);
  const { token: cookie } = await signIn({ email, password: PASSWORD }, visitor());
  const found = await actorOfToken(cookie, "r");
  expect(found?.personId).toBe(personId);
  expect([...(found?.roles ?? [])].sort()).toEqual(["editor", "publisher"]);
});

test("two clicks at once use a link once", async () => {
  const admin = await makeActor("admin");
  await invitePerson(admin, { email: "twice@tern.example", name: "Twice", roles: ["editor"] });
  const input = { token: await linkTo("twice@tern.example"), password: PASSWORD, again: PASSWORD };
  const outcomes = await Promise.allSettled([acceptInvitation(input, "r"), acceptInvitation(input, "r")]);
  expect(outcomes.filter((one) => one.status === "fulfilled")).toHaveLength(1);
});

test("inviting again ends the older link; an expired link is refused", async () => {
  const admin = await makeActor("admin");
  const email = "again@tern.example";
  const personId = await invitePerson(admin, { email, name: "Again", roles: ["editor"] });
  const first = await linkTo(email);
  await inviteAgain(admin, { personId, version: 1 });
  const second = await linkTo(email);
  const choose = (token: string) => acceptInvitation({ token, password: PASSWORD, again: PASSWORD }, "r");
  await expect(choose(first)).rejects.toBeInstanceOf(NotFound);
  await db()
    .update(oneTimeLink)
    .set({ expiresAt: new Date(Date.now() - 1000) })
    .where(eq(oneTimeLink.personId, personId));
  await expect(choose(second)).rejects.toBeInstanceOf(NotFound);
});

test("a second invitation to one address is refused at the field", async () => {
  const admin = await makeActor("admin");
  const input = { email: "one@tern.example", name: "One", roles: ["editor" as const] };
  await invitePerson(admin, input);
  await expect(invitePerson(admin, input)).rejects.toMatchObject({ fields: { email: [expect.any(String)] } });
});

test("a reset ends every session, works once, and says nothing of who exists", async () => {
  const actor = await member("editor");
  const { token: cookie } = await signIn({ email: actor.email, password: PASSWORD }, visitor());
  await requestReset({ email: "ghost2@tern.example" }, visitor());
  expect(await linkTo("ghost2@tern.example")).toBe("");
  await requestReset({ email: actor.email }, visitor());
  const token = await linkTo(actor.email);
  const input = { token, password: "another long password", again: "another long password" };
  await resetPassword(input, "r");
  expect(await actorOfToken(cookie, "r")).toBeNull();
  await expect(resetPassword(input, "r")).rejects.toBeInstanceOf(NotFound);
  await expect(signIn({ email: actor.email, password: PASSWORD }, visitor())).rejects.toBeInstanceOf(Invalid);
  expect((await signIn({ email: actor.email, password: input.password }, visitor())).token).not.toBe("");
});

test("changing one's password asks for the present one and ends the other sessions", async () => {
  const actor = await member("editor");
  const here = await signIn({ email: actor.email, password: PASSWORD }, visitor());
  const there = await signIn({ email: actor.email, password: PASSWORD }, visitor());
  const me = await actorOfToken(here.token, "r");
  const next = { password: "quite another sentence", again: "quite another sentence" };
  await expect(changePassword(me, { current: "wrong", ...next })).rejects.toMatchObject({
    fields: { current: [expect.any(String)] },
  });
  await changePassword(me, { current: PASSWORD, ...next });
  expect(await actorOfToken(here.token, "r")).not.toBeNull();
  expect(await actorOfToken(there.token, "r")).toBeNull();
});

test("one's own address is no password", async () => {
  const actor = await member("editor");
  await expect(
    changePassword(actor, { current: PASSWORD, password: actor.email.toUpperCase(), again: actor.email.toUpperCase() }),
  ).rejects.toMatchObject({ fields: { password: [expect.any(String)] } });
});

test("roles and closing an account count from the next request", async () => {
  const admin = await makeActor("admin");
  const actor = await member("editor");
  const { token } = await signIn({ email: actor.email, password: PASSWORD }, visitor());
  await changeRoles(admin, { personId: actor.personId, version: 1, roles: ["scientist"] });
  expect((await actorOfToken(token, "r"))?.roles).toEqual(["scientist"]);
  await expect(changeRoles(admin, { personId: actor.personId, version: 1, roles: ["editor"] })).rejects.toBeInstanceOf(
    Conflict,
  );
  await deactivatePerson(admin, { personId: actor.personId, version: 2 });
  expect(await actorOfToken(token, "r")).toBeNull();
  await reactivatePerson(admin, { personId: actor.personId, version: 3 });
  expect(await actorOfToken(token, "r")).toBeNull();
});

test("being seen is written down at most once a minute", async () => {
  const actor = await member("editor");
  const { token } = await signIn({ email: actor.email, password: PASSWORD }, visitor());
  const mine = eq(session.personId, actor.personId);
  const seen = async () => (await db().select().from(session).where(mine))[0]?.lastSeenAt.getTime() ?? 0;
  const setSeen = (agoMs: number) =>
    db()
      .update(session)
      .set({ lastSeenAt: new Date(Date.now() - agoMs) })
      .where(mine);
  await setSeen(SEEN_EVERY_MS - 10_000);
  const before = await seen();
  await actorOfToken(token, "r");
  expect(await seen()).toBe(before);
  await setSeen(SEEN_EVERY_MS + 1000);
  await actorOfToken(token, "r");
  expect(Date.now() - (await seen())).toBeLessThan(SEEN_EVERY_MS);
});

test("signing in anew ends the session that the browser held", async () => {
  const actor = await member("editor");
  const first = await signIn({ email: actor.email, password: PASSWORD }, visitor());
  const held = await actorOfToken(first.token, "r");
  await signIn({ email: actor.email, password: PASSWORD }, { ...visitor(), sessionId: held?.sessionId ?? null });
  expect(await actorOfToken(first.token, "r")).toBeNull();
});

test("a sign-in that a reset overtakes is refused, so that the old password opens nothing after it", async () => {
  const actor = await member("editor");
  const replaced = await hashPassword("the password that was chosen meanwhile");
  const compare = vi.spyOn(passwords, "passwordMatches").mockImplementationOnce(async () => {
    await db().update(person).set({ passwordHash: replaced }).where(eq(person.id, actor.personId));
    return true;
  });
  await expect(signIn({ email: actor.email, password: PASSWORD }, visitor())).rejects.toBeInstanceOf(Invalid);
  expect(compare).toHaveBeenCalledOnce();
  expect(await db().select().from(session).where(eq(session.personId, actor.personId))).toEqual([]);
});

test("closing an account and changing its password end the links that were still open", async () => {
  const admin = await makeActor("admin");
  const choose = { password: "a sentence of some length", again: "a sentence of some length" };
  const email = "late@tern.example";
  const personId = await invitePerson(admin, { email, name: "Late", roles: ["editor"] });
  const invitation = await linkTo(email);
  await deactivatePerson(admin, { personId, version: 1 });
  await expect(acceptInvitation({ token: invitation, ...choose }, "r")).rejects.toBeInstanceOf(NotFound);
  await reactivatePerson(admin, { personId, version: 2 });
  await expect(acceptInvitation({ token: invitation, ...choose }, "r")).rejects.toBeInstanceOf(NotFound);
  // However an account came to be closed, a link that is still open opens nothing.
  await invitePerson(admin, { email: "later@tern.example", name: "Later", roles: ["editor"] });
  await db().update(person).set({ state: "deactivated" }).where(eq(person.email, "later@tern.example"));
  const later = { token: await linkTo("later@tern.example"), ...choose };
  await expect(acceptInvitation(later, "r")).rejects.toBeInstanceOf(NotFound);
  const actor = await member("editor");
  await requestReset({ email: actor.email }, visitor());
  const reset = await linkTo(actor.email);
  await changePassword(actor, { current: PASSWORD, ...choose });
  await expect(resetPassword({ token: reset, ...choose }, "r")).rejects.toBeInstanceOf(NotFound);
});

test("asking for a new password takes its time, whether there is an account or not", async () => {
  const actor = await member("editor");
  for (const email of [actor.email, "ghost3@tern.example"]) {
    const from = performance.now();
    await requestReset({ email }, visitor());
    // Timers may fire a millisecond early.
    expect(performance.now() - from).toBeGreaterThan(ANSWER_AFTER_MS - 2);
  }
});

test("the first administrator is invited once, by whoever runs the server", async () => {
  await db().update(person).set({ state: "deactivated" });
  const personId = await inviteFirstAdmin({ email: "first@tern.example", name: "First" });
  await acceptInvitation({ token: await linkTo("first@tern.example"), password: PASSWORD, again: PASSWORD }, "r");
  const { token } = await signIn({ email: "first@tern.example", password: PASSWORD }, visitor());
  expect(await actorOfToken(token, "r")).toMatchObject({ personId, roles: ["admin"] });
  await expect(inviteFirstAdmin({ email: "other@tern.example", name: "Other" })).rejects.toBeInstanceOf(Locked);
});

test("only an administrator manages people", async () => {
  const input = { email: "x@tern.example", name: "X", roles: ["admin" as const] };
  for (const role of ["editor", "scientist", "publisher"] as const) {
    await expect(invitePerson(await makeActor(role), input)).rejects.toBeInstanceOf(Forbidden);
  }
  await expect(invitePerson(null, input)).rejects.toBeInstanceOf(Unauthenticated);
});

test("the last active administrator cannot be removed, not even by two at once", async () => {
  type Dismiss = (by: Actor, whom: Actor) => Promise<void>;
  const demote: Dismiss = (by, { personId }) => changeRoles(by, { personId, version: 1, roles: ["editor"] });
  const close: Dismiss = (by, { personId }) => deactivatePerson(by, { personId, version: 1 });
  for (const [first, second] of [
    [demote, demote],
    [close, close],
    [close, demote],
    [demote, close],
  ] as const) {
    await db().update(person).set({ state: "deactivated" });
    const [one, two] = [await makeActor("admin"), await makeActor("admin", "editor")];
    const outcomes = await Promise.allSettled([first(one, two), second(two, one)]);
    const refused = outcomes.filter((one) => one.status === "rejected");
    expect(refused).toHaveLength(1);
    expect(refused[0]?.reason).toBeInstanceOf(Locked);
  }
});
