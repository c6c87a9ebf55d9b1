import { and, eq, inArray, ne, or } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { registerConsequence, type Touched } from "#app/audit/consequences.server.ts";
import { measurement, record } from "#app/database/schema/catalogue.ts";
import { exhibit, scene, sceneCast, sceneFigure } from "#app/database/schema/exhibits.ts";
import type { ExhibitContent } from "#app/exhibits/content.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { compareContent, type Moved } from "./compare-content.ts";
import { sealable } from "./digest.server.ts";
import { tellContributors, tellRole } from "./hand-over.server.ts";
import { readStandingSeals } from "./signers.server.ts";
import { voidStandingSeals } from "./void-seals.server.ts";

/**
 * After every change, in its transaction: the exhibits under review that read what was touched are resolved again. Where
 * the digest is another one, the seals end and it is told which figures moved. A save that moves nothing ends nothing.
 */
export async function voidMovedSeals(c: Change, touched: readonly Touched[]): Promise<void> {
  for (const exhibitId of await exhibitsUnderReview(c, touched)) await voidIfMoved(c, exhibitId);
}

async function exhibitsUnderReview(c: Change, touched: readonly Touched[]): Promise<string[]> {
  const ids = (type: Touched["type"]) => touched.filter((one) => one.type === type).map((one) => one.id);
  const records = [...ids("record"), ...(await recordsOfSources(c, ids("source")))];
  const scenes = await c.tx
    .selectDistinct({ exhibitId: scene.exhibitId })
    .from(scene)
    .innerJoin(exhibit, eq(exhibit.id, scene.exhibitId))
    .leftJoin(sceneCast, eq(sceneCast.sceneId, scene.id))
    .leftJoin(sceneFigure, eq(sceneFigure.sceneId, scene.id))
    .where(
      or(
        inArray(sceneCast.recordId, orNone(records)),
        inArray(sceneFigure.recordId, orNone(records)),
        inArray(scene.mediaId, orNone(ids("media"))),
      ),
    );
  const candidates = [...new Set([...scenes.map((row) => row.exhibitId), ...ids("exhibit")])];
  const reviewed = await c.tx
    .select({ id: exhibit.id })
    .from(exhibit)
    .where(and(inArray(exhibit.id, orNone(candidates)), ne(exhibit.state, "draft")));
  return reviewed.map((row) => row.id);
}

/** IN () is no SQL: an id that nothing has stands for "none". */
function orNone(ids: string[]): string[] {
  return ids.length > 0 ? ids : ["-"];
}

async function recordsOfSources(c: Change, sourceIds: string[]): Promise<string[]> {
  if (sourceIds.length === 0) return [];
  const cited = await c.tx
    .selectDistinct({ id: record.id })
    .from(record)
    .leftJoin(measurement, eq(measurement.id, record.adoptedParallaxId))
    .where(or(inArray(record.positionSourceId, sourceIds), inArray(measurement.sourceId, sourceIds)));
  return cited.map((row) => row.id);
}

async function voidIfMoved(c: Change, exhibitId: string): Promise<void> {
  const [newest] = await readStandingSeals(c.tx, exhibitId);
  if (!newest) return;
  const content = await resolveExhibit(c.tx, exhibitId);
  if (sealable(content).digest === newest.digest) return;
  const moved = compareContent(JSON.parse(newest.content.toString("utf8")) as ExhibitContent, content);
  const about = { exhibitId, title: content.title.en };
  // Told before the seals end: the signers are found by their standing seals.
  await tellWhatMoved(c, about, moved);
  await voidStandingSeals(c, exhibitId, { why: "moved", by: c.actor.name, note: null, moved });
  await c.tx.update(exhibit).set({ state: "draft" }).where(eq(exhibit.id, exhibitId));
  c.audit({
    objectType: "exhibit",
    objectId: exhibitId,
    objectName: content.title.en,
    before: { seal: newest.kind, digest: newest.digest },
    after: { state: "draft", moved },
    note: `The seal ended: ${moved.map((one) => one.what).join(", ")}`,
  });
}

async function tellWhatMoved(c: Change, about: { exhibitId: string; title: string }, moved: Moved[]): Promise<void> {
  const lines = [
    `“${about.title}” moved after it was signed (changed by ${c.actor.name}), so its seals have ended:`,
    ...moved.map((one) => `- ${one.sceneTitle}: ${one.what}: ${one.before ?? "nothing"} -> ${one.after ?? "nothing"}`),
    "It has to be submitted and verified again.",
  ];
  await tellContributors(c, about, `Moved: ${about.title}`, lines);
  await tellRole(c, "scientist", about, `Moved: ${about.title}`, lines);
}

registerConsequence("void moved seals", voidMovedSeals);
