import { eq } from "drizzle-orm";
import { expect, test } from "vitest";
import { db } from "#app/database/db.server.ts";
import { oneTimeLink, person } from "#app/database/schema/people.ts";
import { Invalid, Locked, NotFound } from "#app/errors.ts";
import { makeMember, makeVisitor, newestToken, PASSWORD } from "#tests/factories/account.ts";
import { makeActor } from "#tests/factories/person.ts";
import { changePassword } from "./change-password.server.ts";
import { acceptInvitation, resetPassword } from "./choose-password.server.ts";
import { deactivatePerson, reactivatePerson } from "./deactivate-person.server.ts";
import { actorOfToken } from "./find-session.server.ts";
import { inviteFirstAdmin } from "./invite-first-admin.server.ts";
import { inviteAgain, invitePerson } from "./invite-person.server.ts";
import { ANSWER_AFTER_MS, requestReset } from "./request-reset.server.ts";
import { signIn } from "./sign-in.server.ts";

test("an invitation works once, and lets its person in", async () => {
  const admin = await makeActor("admin");
  const email = "ines@tern.example";
  const personId = await invitePerson(admin, { email, name: "Ines", roles: ["editor", "publisher"] });
  const token = await newestToken(email);
  await acceptInvitation({ token, password: PASSWORD, again: PASSWORD }, "r");
  await expect(acceptInvitation({ token, password: PASSWORD, again: PASSWORD }, "r")).rejects.toBeInstanceOf(NotFound);
  const { token: cookie } = await signIn({ email, password: PASSWORD }, makeVisitor());
  const found = await actorOfToken(cookie, "r");
  expect(found?.personId).toBe(personId);
  expect([...(found?.roles ?? [])].sort()).toEqual(["editor", "publisher"]);
});

test("two clicks at once use a link once", async () => {
  const admin = await makeActor("admin");
  await invitePerson(admin, { email: "twice@tern.example", name: "Twice", roles: ["editor"] });
  const input = { token: await newestToken("twice@tern.example"), password: PASSWORD, again: PASSWORD };
  const outcomes = await Promise.allSettled([acceptInvitation(input, "r"), acceptInvitation(input, "r")]);
  expect(outcomes.filter((one) => one.status === "fulfilled")).toHaveLength(1);
});

test("inviting again ends the older link; an expired link is refused", async () => {
  const admin = await makeActor("admin");
  const email = "again@tern.example";
  const personId = await invitePerson(admin, { email, name: "Again", roles: ["editor"] });
  const first = await newestToken(email);
  await inviteAgain(admin, { personId, version: 1 });
  const second = await newestToken(email);
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
  const actor = await makeMember("editor");
  const { token: cookie } = await signIn({ email: actor.email, password: PASSWORD }, makeVisitor());
  await requestReset({ email: "ghost2@tern.example" }, makeVisitor());
  expect(await newestToken("ghost2@tern.example")).toBe("");
  await requestReset({ email: actor.email }, makeVisitor());
  const token = await newestToken(actor.email);
  const input = { token, password: "another long password", again: "another long password" };
  await resetPassword(input, "r");
  expect(await actorOfToken(cookie, "r")).toBeNull();
  await expect(resetPassword(input, "r")).rejects.toBeInstanceOf(NotFound);
  await expect(signIn({ email: actor.email, password: PASSWORD }, makeVisitor())).rejects.toBeInstanceOf(Invalid);
  expect((await signIn({ email: actor.email, password: input.password }, makeVisitor())).token).not.toBe("");
});

test("closing an account and changing its password end the links that were still open", async () => {
  const admin = await makeActor("admin");
  const choose = { password: "a sentence of some length", again: "a sentence of some length" };
  const email = "late@tern.example";
  const personId = await invitePerson(admin, { email, name: "Late", roles: ["editor"] });
  const invitation = await newestToken(email);
  await deactivatePerson(admin, { personId, version: 1 });
  await expect(acceptInvitation({ token: invitation, ...choose }, "r")).rejects.toBeInstanceOf(NotFound);
  await reactivatePerson(admin, { personId, version: 2 });
  await expect(acceptInvitation({ token: invitation, ...choose }, "r")).rejects.toBeInstanceOf(NotFound);
  // However an account came to be closed, a link that is still open opens nothing.
  await invitePerson(admin, { email: "later@tern.example", name: "Later", roles: ["editor"] });
  await db().update(person).set({ state: "deactivated" }).where(eq(person.email, "later@tern.example"));
  const later = { token: await newestToken("later@tern.example"), ...choose };
  await expect(acceptInvitation(later, "r")).rejects.toBeInstanceOf(NotFound);
  const actor = await makeMember("editor");
  await requestReset({ email: actor.email }, makeVisitor());
  const reset = await newestToken(actor.email);
  await changePassword(actor, { current: PASSWORD, ...choose });
  await expect(resetPassword({ token: reset, ...choose }, "r")).rejects.toBeInstanceOf(NotFound);
});

test("asking for a new password takes its time, whether there is an account or not", async () => {
  const actor = await makeMember("editor");
  for (const email of [actor.email, "ghost3@tern.example"]) {
    const from = performance.now();
    await requestReset({ email }, makeVisitor());
    // Timers may fire a millisecond early.
    expect(performance.now() - from).toBeGreaterThan(ANSWER_AFTER_MS - 2);
  }
});

test("the first administrator is invited once, by whoever runs the server", async () => {
  await db().update(person).set({ state: "deactivated" });
  const personId = await inviteFirstAdmin({ email: "first@tern.example", name: "First" });
  await acceptInvitation({ token: await newestToken("first@tern.example"), password: PASSWORD, again: PASSWORD }, "r");
  const { token } = await signIn({ email: "first@tern.example", password: PASSWORD }, makeVisitor());
  expect(await actorOfToken(token, "r")).toMatchObject({ personId, roles: ["admin"] });
  await expect(inviteFirstAdmin({ email: "other@tern.example", name: "Other" })).rejects.toBeInstanceOf(Locked);
});
