import { eq } from "drizzle-orm";
import { expect, test } from "vitest";
import { change } from "#app/audit/change.server.ts";
import { registerConsequence } from "#app/audit/consequences.server.ts";
import { db } from "#app/database/db.server.ts";
import { auditEntry } from "#app/database/schema/audit.ts";
import { outbox } from "#app/database/schema/jobs.ts";
import { readCaughtMail } from "#app/mail/read-caught-mail.server.ts";
import { sendMail } from "#app/mail/send-mail.server.ts";
import { drainOutbox, MOST_ATTEMPTS } from "./drain-outbox.server.ts";

const actor = { personId: "", name: "Test", email: "t@tern.example", roles: [], sessionId: null, requestId: "r" };
const note = { objectType: "thing", objectId: "01J0000000000000000000000A", objectName: "Thing" };
const message = (subject: string) => ({ to: "ines@tern.example", subject, text: "It is your turn." });

test("a mail promised in a change is sent by the worker, once", async () => {
  await change(actor, "test.promise", async (c) => {
    c.audit(note);
    c.mail(message("Promised"));
  });
  expect(await drainOutbox({ mail: sendMail })).toEqual({ done: 1, failed: 0 });
  expect(await drainOutbox({ mail: sendMail })).toEqual({ done: 0, failed: 0 });
  const caught = (await readCaughtMail()) ?? [];
  expect(caught.filter((mail) => mail.subject === "Promised")).toHaveLength(1);
});

test("of a mail that was sent its text, which may hold a one-time link, is not kept", async () => {
  await change(actor, "test.secret", async (c) => {
    c.audit(note);
    c.mail({ ...message("Secret"), text: "http://127.0.0.1/invitation/the-token" });
  });
  await drainOutbox({ mail: sendMail });
  const rows = await db().select().from(outbox);
  expect(JSON.stringify(rows)).not.toContain("the-token");
  expect(rows.map((row) => row.payload)).toContainEqual({ to: "ines@tern.example", subject: "Secret" });
});

test("a change that fails promises nothing and writes no audit row", async () => {
  await expect(
    change(actor, "test.fails", async (c) => {
      c.audit(note);
      c.mail(message("Never"));
      throw new Error("no");
    }),
  ).rejects.toThrow("no");
  expect(await db().select().from(auditEntry).where(eq(auditEntry.verb, "test.fails"))).toEqual([]);
  expect(await drainOutbox({ mail: sendMail })).toEqual({ done: 0, failed: 0 });
});

test("a consequence that fails undoes the change", async () => {
  registerConsequence("test", async () => {
    throw new Error("consequence");
  });
  await expect(
    change(actor, "test.consequence", async (c) => {
      c.audit(note);
      c.touch({ type: "record", id: note.objectId });
    }),
  ).rejects.toThrow("consequence");
  expect(await db().select().from(auditEntry).where(eq(auditEntry.verb, "test.consequence"))).toEqual([]);
});

test("a change without an audit row is refused", async () => {
  await expect(change(actor, "test.silent", async () => {})).rejects.toThrow("without an audit row");
});

test("mail that is down is tried again later, and given up in the end", async () => {
  await change(actor, "test.down", async (c) => {
    c.audit(note);
    c.mail(message("Down"));
  });
  const down = async () => {
    throw new Error("connection refused");
  };
  expect(await drainOutbox({ mail: down })).toEqual({ done: 0, failed: 1 });
  const [row] = await db().select().from(outbox).where(eq(outbox.lastError, "connection refused"));
  expect(row?.attempts).toBe(1);
  expect(row?.availableAt.getTime()).toBeGreaterThan(Date.now());
  await db()
    .update(outbox)
    .set({ attempts: MOST_ATTEMPTS - 1, availableAt: new Date(0) })
    .where(eq(outbox.id, row?.id ?? ""));
  await drainOutbox({ mail: down });
  const [givenUp] = await db()
    .select()
    .from(outbox)
    .where(eq(outbox.id, row?.id ?? ""));
  expect(givenUp?.failedAt).not.toBeNull();
});

test("the audit log refuses to be changed or deleted", async () => {
  await expect(db().delete(auditEntry)).rejects.toMatchObject({ cause: { sqlState: "45000" } });
  await expect(db().update(auditEntry).set({ note: "x" })).rejects.toMatchObject({ cause: { sqlState: "45000" } });
});
