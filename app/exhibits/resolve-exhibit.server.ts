import { asc, eq, inArray } from "drizzle-orm";
import { type CastRecord, readCast } from "#app/catalogue/read-cast.server.ts";
import type { Reader } from "#app/database/db.server.ts";
import { exhibit, scene, sceneCast, sceneFigure, sceneWords } from "#app/database/schema/exhibits.ts";
import { media } from "#app/database/schema/media.ts";
import { NotFound } from "#app/errors.ts";
import { claimsOf } from "#app/scene/claims.ts";
import { SceneDocument } from "#app/scene/document.ts";
import type { CastContent, ExhibitContent, FigureContent, PictureContent, SceneContent } from "./content.ts";
import { figureWordsOrReason } from "./figure-words.ts";
import { parseWords } from "./words.ts";

interface Rows {
  cast: (typeof sceneCast.$inferSelect)[];
  figures: (typeof sceneFigure.$inferSelect)[];
  words: (typeof sceneWords.$inferSelect)[];
  records: Map<string, CastRecord>;
  pictures: Map<string, typeof media.$inferSelect>;
  french: boolean;
}

/** Everything that a visitor will see of an exhibit, with every figure worked out. @throws NotFound */
export async function resolveExhibit(reader: Reader, exhibitId: string): Promise<ExhibitContent> {
  const [found] = await reader.select().from(exhibit).where(eq(exhibit.id, exhibitId));
  if (!found) throw new NotFound("There is no such exhibit.");
  const scenes = await reader
    .select()
    .from(scene)
    .where(eq(scene.exhibitId, exhibitId))
    .orderBy(asc(scene.position), asc(scene.id));
  const french = found.titleFr !== null;
  const rows = await readRows(reader, scenes, french);
  return {
    format: "alidade-exhibit/1",
    slug: found.slug,
    title: { en: found.titleEn, fr: found.titleFr },
    languages: french ? ["en", "fr"] : ["en"],
    scenes: scenes.map((one) => resolveScene(one, rows)),
  };
}

async function readRows(reader: Reader, scenes: (typeof scene.$inferSelect)[], french: boolean): Promise<Rows> {
  const ids = scenes.length > 0 ? scenes.map((one) => one.id) : ["-"];
  const cast = await reader
    .select()
    .from(sceneCast)
    .where(inArray(sceneCast.sceneId, ids))
    .orderBy(asc(sceneCast.position), asc(sceneCast.recordId));
  const figures = await reader
    .select()
    .from(sceneFigure)
    .where(inArray(sceneFigure.sceneId, ids))
    .orderBy(asc(sceneFigure.key));
  const words = await reader.select().from(sceneWords).where(inArray(sceneWords.sceneId, ids));
  const recordIds = [...new Set([...cast, ...figures].map((row) => row.recordId))];
  const records = new Map((await readCast(reader, recordIds)).map((one) => [one.id, one]));
  const mediaIds = scenes.flatMap((one) => (one.mediaId ? [one.mediaId] : []));
  const pictures = mediaIds.length > 0 ? await reader.select().from(media).where(inArray(media.id, mediaIds)) : [];
  return { cast, figures, words, records, pictures: new Map(pictures.map((one) => [one.id, one])), french };
}

function resolveScene(of: typeof scene.$inferSelect, rows: Rows): SceneContent {
  const document = SceneDocument.parse(of.document);
  const body = (language: "en" | "fr") =>
    parseWords(rows.words.find((row) => row.sceneId === of.id && row.language === language)?.body ?? "");
  const cast = rows.cast.filter((row) => row.sceneId === of.id);
  const figures = rows.figures.filter((row) => row.sceneId === of.id);
  return {
    id: of.id,
    title: { en: of.titleEn, fr: rows.french ? of.titleFr : null },
    document,
    claims: claimsOf(document),
    cast: cast.flatMap((row) => {
      const record = rows.records.get(row.recordId);
      return record ? [resolveMember(record, row.labelled, rows.french)] : [];
    }),
    figures: Object.fromEntries(
      figures.map((row) => [row.key, resolveFigure(row, rows.records.get(row.recordId), rows.french)]),
    ),
    words: { en: body("en"), fr: rows.french ? body("fr") : null },
    picture: pictureOf(of.mediaId ? rows.pictures.get(of.mediaId) : undefined, rows.french),
  };
}

const IN_CAST = { quantity: "distance", unit: "ly", form: "value" } as const;

function resolveMember(record: CastRecord, labelled: boolean, french: boolean): CastContent {
  const { distance } = record;
  const words = distance?.pc ? figureWordsOrReason(distance, IN_CAST) : null;
  const range =
    distance?.pc && words?.en ? { value: distance.pc.value, low: distance.pc.low, high: distance.pc.high } : null;
  return {
    recordId: record.id,
    name: { en: record.name.en, fr: french ? record.name.fr : null },
    labelled,
    raDeg: record.raDeg,
    decDeg: record.decDeg,
    epoch: record.epoch,
    bv: record.bv,
    vMag: record.vMag,
    parallax: record.parallax,
    distancePc: range,
    regime: distance?.regime ?? null,
    method: distance?.method ?? null,
    distance: words?.en ? { en: words.en, fr: words.fr } : null,
    source: record.source,
    vetted: record.vetted,
  };
}

function resolveFigure(
  row: typeof sceneFigure.$inferSelect,
  record: CastRecord | undefined,
  french: boolean,
): FigureContent {
  const { recordId, quantity, unit, form } = row;
  const bound = { recordId, quantity, unit, form, source: record?.source ?? null };
  const distance = record?.distance;
  if (!distance) {
    return { ...bound, en: null, fr: null, reason: `${record?.name.en ?? "The record"} has no adopted parallax.` };
  }
  const { en, fr, reason } = figureWordsOrReason(distance, row);
  return { ...bound, en, fr: french ? fr : null, reason };
}

function pictureOf(found: typeof media.$inferSelect | undefined, french: boolean): PictureContent | null {
  if (!found) return null;
  const { digest, width, height, creator, creditLine, licence, altEn, altFr } = found;
  return { digest, width, height, creator, creditLine, licence, alt: { en: altEn, fr: french ? altFr : null } };
}
