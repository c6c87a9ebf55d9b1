import { createHash } from "node:crypto";
import { desc, eq } from "drizzle-orm";
import { expect, test } from "vitest";
import type { Actor } from "#app/audit/actor.ts";
import { adoptParallax } from "#app/catalogue/adopt-parallax.server.ts";
import { editRecord } from "#app/catalogue/edit-record.server.ts";
import { AdoptParallax, EditRecord } from "#app/catalogue/record-input.ts";
import { unvetRecord } from "#app/catalogue/vet-record.server.ts";
import { db } from "#app/database/db.server.ts";
import { record } from "#app/database/schema/catalogue.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { outbox } from "#app/database/schema/jobs.ts";
import { seal } from "#app/database/schema/review.ts";
import { Conflict, Forbidden, Invalid } from "#app/errors.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { saveWords } from "#app/exhibits/save-words.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { makeMeasurement } from "#tests/factories/catalogue.ts";
import { makeExhibit } from "#tests/factories/exhibit.ts";
import { makeActor } from "#tests/factories/person.ts";
import { approveExhibit } from "./approve-exhibit.server.ts";
import { sealable } from "./digest.server.ts";
import "./register.server.ts";
import { sendBack } from "./send-back.server.ts";
import { submitExhibit } from "./submit-exhibit.server.ts";
import { takeBack } from "./take-back.server.ts";
import { verifyExhibit } from "./verify-exhibit.server.ts";
import type { VoidReason } from "./void-seals.server.ts";

const cast = async () => ({
  editor: await makeActor("editor"),
  vetter: await makeActor("scientist"),
  scientist: await makeActor("scientist"),
  publisher: await makeActor("publisher"),
});
const exhibitRow = async (id: string) => (await db().select().from(exhibit).where(eq(exhibit.id, id)))[0];
const sign = async (exhibitId: string) => ({
  exhibitId,
  version: (await exhibitRow(exhibitId))?.version ?? 0,
  digest: sealable(await resolveExhibit(db(), exhibitId)).digest,
  note: null,
});
const seals = (exhibitId: string) =>
  db().select().from(seal).where(eq(seal.exhibitId, exhibitId)).orderBy(desc(seal.id));
const reasonOf = (of: { voidReason: unknown } | undefined) => of?.voidReason as VoidReason;
const mailsTo = async (actor: Actor) =>
  (await db().select().from(outbox))
    .map((row) => row.payload as { to: string; subject: string })
    .filter((mail) => mail.to === actor.email);
/** An exhibit that has been submitted and verified. */
const verified = async () => {
  const who = await cast();
  const made = await makeExhibit(who.editor, who.vetter);
  await submitExhibit(who.editor, await sign(made.exhibitId));
  await verifyExhibit(who.scientist, await sign(made.exhibitId));
  return { ...who, ...made };
};

test("editor submits, scientist verifies, publisher approves; each hand-over is mailed to whose turn it is", async () => {
  const { exhibitId, scientist, publisher, editor } = await verified();
  expect((await mailsTo(scientist)).some((mail) => mail.subject === "To verify: How far")).toBe(true);
  expect((await mailsTo(publisher)).some((mail) => mail.subject === "To approve: How far")).toBe(true);
  await approveExhibit(publisher, await sign(exhibitId));
  expect((await mailsTo(editor)).map((mail) => mail.subject)).toEqual(["Verified: How far", "Approved: How far"]);
  expect((await exhibitRow(exhibitId))?.state).toBe("approved");
  const kept = await seals(exhibitId);
  expect(kept.map((one) => one.kind)).toEqual(["approved", "verified", "submitted"]);
  for (const one of kept) {
    expect(createHash("sha256").update(one.content).digest("hex")).toBe(one.digest);
  }
});

test("nobody signs their own work, and nobody signs twice", async () => {
  const everything = await makeActor("editor", "scientist", "publisher");
  const { vetter, scientist } = await cast();
  const made = await makeExhibit(everything, vetter);
  await submitExhibit(everything, await sign(made.exhibitId));
  await expect(verifyExhibit(everything, await sign(made.exhibitId))).rejects.toBeInstanceOf(Forbidden);
  const both = await makeActor("scientist", "publisher");
  await verifyExhibit(both, await sign(made.exhibitId));
  await expect(approveExhibit(both, await sign(made.exhibitId))).rejects.toBeInstanceOf(Forbidden);
  await expect(approveExhibit(everything, await sign(made.exhibitId))).rejects.toBeInstanceOf(Forbidden);
  await expect(approveExhibit(scientist, await sign(made.exhibitId))).rejects.toBeInstanceOf(Forbidden);
});

test("a digest that is not what stands there is refused", async () => {
  const { editor, vetter } = await cast();
  const made = await makeExhibit(editor, vetter);
  const input = { ...(await sign(made.exhibitId)), digest: "0".repeat(64) };
  await expect(submitExhibit(editor, input)).rejects.toBeInstanceOf(Conflict);
});

test("submitting twice signs once", async () => {
  const { editor, vetter } = await cast();
  const made = await makeExhibit(editor, vetter);
  const input = await sign(made.exhibitId);
  const outcomes = await Promise.allSettled([submitExhibit(editor, input), submitExhibit(editor, input)]);
  expect(outcomes.map((one) => one.status).sort()).toEqual(["fulfilled", "rejected"]);
  expect(await seals(made.exhibitId)).toHaveLength(1);
});

test("what blocks is told all at once", async () => {
  const { editor, vetter } = await cast();
  const made = await makeExhibit(editor, vetter);
  await unvetRecord(vetter, { recordId: made.star.recordId, version: made.star.version, reason: "Again" });
  const refusal = await submitExhibit(editor, await sign(made.exhibitId)).catch((error) => error);
  expect(refusal).toBeInstanceOf(Invalid);
  expect(refusal.fields[""].join(" ")).toContain("is not vetted");
});

test("adopting another value ends the seals and names the figure that moved, old and new", async () => {
  const { exhibitId, editor, star } = await verified();
  const measurementId = await makeMeasurement(editor, star.recordId, { printed: "100.00 ± 0.36" });
  await adoptParallax(
    editor,
    parseInput(AdoptParallax, { recordId: star.recordId, version: star.version, measurementId, reason: "Newer" }),
  );
  expect((await exhibitRow(exhibitId))?.state).toBe("draft");
  const [newest] = await seals(exhibitId);
  expect(newest?.voidedAt).not.toBeNull();
  const { why, moved } = reasonOf(newest);
  expect(why).toBe("moved");
  expect(moved[0]).toMatchObject({
    kind: "figure",
    what: "figure {star} in the words",
    before: "25.04\u00a0light-years",
    after: "32.62\u00a0light-years",
    readsDifferently: true,
  });
});

test("changed words end the seals", async () => {
  const { exhibitId, editor, sceneId, sceneVersion } = await verified();
  await saveWords(editor, { sceneId, version: sceneVersion, en: "This star is only {star} away.", fr: "" });
  expect((await exhibitRow(exhibitId))?.state).toBe("draft");
  const [newest] = await seals(exhibitId);
  expect(reasonOf(newest).moved).toMatchObject([{ kind: "text", what: "words (en)" }]);
});

test("a save without a change ends nothing", async () => {
  const { exhibitId, editor, sceneId, sceneVersion, star } = await verified();
  await saveWords(editor, { sceneId, version: sceneVersion, en: "This star is {star} away.\r\n", fr: "" });
  const [kept] = await db().select().from(record).where(eq(record.id, star.recordId));
  const form = {
    recordId: star.recordId,
    version: star.version,
    name: kept?.name,
    kind: kept?.kind,
    ra: kept?.raText,
    dec: kept?.decText,
    positionEpoch: kept?.positionEpoch,
    positionSourceId: kept?.positionSourceId,
    positionLocator: kept?.positionLocator,
  };
  await editRecord(editor, parseInput(EditRecord, form));
  // A measurement that is only proposed is not read by anybody.
  await makeMeasurement(editor, star.recordId, { printed: "99 ± 1" });
  expect((await exhibitRow(exhibitId))?.state).toBe("verified");
  expect((await seals(exhibitId)).every((one) => one.voidedAt === null)).toBe(true);
});

test("a value that moves but reads the same ends the seals and says so", async () => {
  const { exhibitId, editor, star } = await verified();
  const measurementId = await makeMeasurement(editor, star.recordId, { printed: "130.231 ± 0.36" });
  await adoptParallax(
    editor,
    parseInput(AdoptParallax, { recordId: star.recordId, version: star.version, measurementId, reason: "Newer" }),
  );
  const [newest] = await seals(exhibitId);
  const figures = reasonOf(newest).moved.filter((one) => one.kind === "figure");
  expect(figures).not.toHaveLength(0);
  expect(figures.every((one) => !one.readsDifferently)).toBe(true);
});

test("approving checks the verified bytes, even when nothing told it that they moved", async () => {
  const { exhibitId, publisher, star } = await verified();
  // Behind the program's back, as a repair by hand in the database would be.
  await db().update(record).set({ name: "Moved" }).where(eq(record.id, star.recordId));
  await expect(approveExhibit(publisher, await sign(exhibitId))).rejects.toBeInstanceOf(Conflict);
});

test("sending back takes a reason and the right role, and ends the round", async () => {
  const { exhibitId, scientist, publisher, editor } = await verified();
  const version = (await exhibitRow(exhibitId))?.version ?? 0;
  await expect(sendBack(scientist, { exhibitId, version, note: "Mine was earlier" })).rejects.toBeInstanceOf(Forbidden);
  await sendBack(publisher, { exhibitId, version, note: "Please shorten it" });
  expect((await exhibitRow(exhibitId))?.state).toBe("draft");
  expect((await seals(exhibitId)).every((one) => one.voidedAt !== null)).toBe(true);
  expect((await mailsTo(editor)).map((mail) => mail.subject)).toContain("Sent back: How far");
});

test("an editor takes their exhibit back out of review", async () => {
  const { exhibitId, editor } = await verified();
  await takeBack(editor, { exhibitId, version: (await exhibitRow(exhibitId))?.version ?? 0, note: null });
  expect((await exhibitRow(exhibitId))?.state).toBe("draft");
});
