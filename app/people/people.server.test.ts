import { eq } from "drizzle-orm";
import { afterEach, expect, test, vi } from "vitest";
import type { Actor } from "#app/audit/actor.ts";
import { db } from "#app/database/db.server.ts";
import { person, session } from "#app/database/schema/people.ts";
import { Conflict, Forbidden, Invalid, Locked, NotFound, TooMany, Unauthenticated } from "#app/errors.ts";
import { makeMember, makeVisitor, PASSWORD } from "#tests/factories/account.ts";
import { makeActor, makePerson } from "#tests/factories/person.ts";
import { changePassword } from "./change-password.server.ts";
import { changeRoles } from "./change-roles.server.ts";
import { deactivatePerson, reactivatePerson } from "./deactivate-person.server.ts";
import { actorOfToken } from "./find-session.server.ts";
import { invitePerson } from "./invite-person.server.ts";
import * as passwords from "./password.server.ts";
import { hashPassword } from "./password.server.ts";
import { readAccount } from "./read-people.server.ts";
import { revokeSession } from "./revoke-session.server.ts";
import { ABSOLUTE_MS, IDLE_MS, SEEN_EVERY_MS } from "./session-limits.ts";
import { signIn } from "./sign-in.server.ts";
import { signOut } from "./sign-out.server.ts";

afterEach(() => vi.restoreAllMocks());

test("signing in gives a new token each time, and only its hash is kept", async () => {
  const actor = await makeMember("editor");
  const one = await signIn({ email: actor.email, password: PASSWORD }, makeVisitor());
  const two = await signIn({ email: actor.email, password: PASSWORD }, makeVisitor());
  expect(one.token).not.toBe(two.token);
  const rows = await db().select().from(session).where(eq(session.personId, actor.personId));
  expect(rows).toHaveLength(2);
  expect(JSON.stringify(rows)).not.toContain(one.token);
  expect(await actorOfToken(one.token, "r")).toMatchObject({ personId: actor.personId, roles: ["editor"] });
});

test("a wrong address, a wrong password, an invited and a closed account are refused in the same words", async () => {
  const actor = await makeMember("editor");
  const invited = await makePerson({ state: "invited" });
  const closed = await makeMember();
  await db().update(person).set({ state: "deactivated" }).where(eq(person.id, closed.personId));
  const said = new Set<string>();
  for (const [email, password] of [
    ["nobody@tern.example", PASSWORD],
    [actor.email, "wrong"],
    [invited.email, PASSWORD],
    [closed.email, PASSWORD],
  ] as const) {
    const refusal = await signIn({ email, password }, makeVisitor()).catch((error: Error) => error);
    expect(refusal).toBeInstanceOf(Invalid);
    said.add((refusal as Error).message);
  }
  expect(said.size).toBe(1);
});

test("attempts are limited by account, whether it exists or not", async () => {
  const actor = await makeMember("editor");
  for (const email of [actor.email, "ghost@tern.example"]) {
    const outcomes: unknown[] = [];
    for (let attempt = 0; attempt < 11; attempt += 1) {
      outcomes.push(await signIn({ email, password: "wrong" }, makeVisitor()).catch((error) => error.constructor));
    }
    expect(outcomes.slice(0, 10).every((outcome) => outcome === Invalid)).toBe(true);
    expect(outcomes[10]).toBe(TooMany);
  }
});

test("attempts are limited by address", async () => {
  const here = makeVisitor();
  let refused: unknown;
  for (let attempt = 0; attempt < 61; attempt += 1) {
    const email = `guess-${attempt}@tern.example`;
    refused = await signIn({ email, password: "x" }, here).catch((error) => error);
  }
  expect(refused).toBeInstanceOf(TooMany);
  expect((refused as TooMany).retryAfterSeconds).toBeGreaterThan(0);
});

test("people who sign in rightly do not use up the attempts of the address they share", async () => {
  const actor = await makeMember("editor");
  const here = makeVisitor();
  for (let time = 0; time < 61; time += 1) {
    // Comparing is slow on purpose; that the password is right is not what is asked here.
    vi.spyOn(passwords, "passwordMatches").mockResolvedValueOnce(true);
    await signIn({ email: actor.email, password: PASSWORD }, here);
  }
});

test("a session ends when idle, when old, when revoked, and when signed out", async () => {
  const actor = await makeMember("editor");
  const open = async () => {
    const { token } = await signIn({ email: actor.email, password: PASSWORD }, makeVisitor());
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
  const [one, other] = [await makeMember("editor"), await makeMember("admin")];
  const { token } = await signIn({ email: one.email, password: PASSWORD }, makeVisitor());
  const found = await actorOfToken(token, "r");
  await expect(revokeSession(other, { sessionId: found?.sessionId ?? "" })).rejects.toBeInstanceOf(NotFound);
  expect(await actorOfToken(token, "r")).not.toBeNull();
});

test("changing one's password asks for the present one and ends the other sessions", async () => {
  const actor = await makeMember("editor");
  const here = await signIn({ email: actor.email, password: PASSWORD }, makeVisitor());
  const there = await signIn({ email: actor.email, password: PASSWORD }, makeVisitor());
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
  const actor = await makeMember("editor");
  await expect(
    changePassword(actor, { current: PASSWORD, password: actor.email.toUpperCase(), again: actor.email.toUpperCase() }),
  ).rejects.toMatchObject({ fields: { password: [expect.any(String)] } });
});

test("roles and closing an account count from the next request", async () => {
  const admin = await makeActor("admin");
  const actor = await makeMember("editor");
  const { token } = await signIn({ email: actor.email, password: PASSWORD }, makeVisitor());
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
  const actor = await makeMember("editor");
  const { token } = await signIn({ email: actor.email, password: PASSWORD }, makeVisitor());
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
  const actor = await makeMember("editor");
  const first = await signIn({ email: actor.email, password: PASSWORD }, makeVisitor());
  const held = await actorOfToken(first.token, "r");
  await signIn({ email: actor.email, password: PASSWORD }, { ...makeVisitor(), sessionId: held?.sessionId ?? null });
  expect(await actorOfToken(first.token, "r")).toBeNull();
});

test("a sign-in that a reset overtakes is refused, so that the old password opens nothing after it", async () => {
  const actor = await makeMember("editor");
  const replaced = await hashPassword("the password that was chosen meanwhile");
  const compare = vi.spyOn(passwords, "passwordMatches").mockImplementationOnce(async () => {
    await db().update(person).set({ passwordHash: replaced }).where(eq(person.id, actor.personId));
    return true;
  });
  await expect(signIn({ email: actor.email, password: PASSWORD }, makeVisitor())).rejects.toBeInstanceOf(Invalid);
  expect(compare).toHaveBeenCalledOnce();
  expect(await db().select().from(session).where(eq(session.personId, actor.personId))).toEqual([]);
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
