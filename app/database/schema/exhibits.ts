import { boolean, index, int, mysqlEnum, mysqlTable, primaryKey, text, uniqueIndex } from "drizzle-orm/mysql-core";
import { createdAt, exact, id, json, ref, version, words } from "../columns.ts";
import { EXHIBIT_STATES, FIGURE_FORMS, FIGURE_QUANTITIES, FIGURE_UNITS, LANGUAGES } from "../enums.ts";
import { record } from "./catalogue.ts";
import { media } from "./media.ts";
import { person } from "./people.ts";

export const exhibit = mysqlTable(
  "exhibit",
  {
    id: id(),
    slug: exact("slug", 60).notNull(),
    titleEn: words("title_en", 160).notNull(),
    titleFr: words("title_fr", 160),
    state: mysqlEnum("state", EXHIBIT_STATES).notNull().default("draft"),
    createdBy: ref("created_by")
      .notNull()
      .references(() => person.id),
    createdAt: createdAt(),
    version: version(),
  },
  // Feeds and kiosks name an exhibit by its slug.
  (t) => [uniqueIndex("exhibit_slug").on(t.slug)],
);

/** Everybody whose hand is in an exhibit's content: none of them may sign it. */
export const exhibitContributor = mysqlTable(
  "exhibit_contributor",
  {
    exhibitId: ref("exhibit_id")
      .notNull()
      .references(() => exhibit.id),
    personId: ref("person_id")
      .notNull()
      .references(() => person.id),
  },
  (t) => [primaryKey({ columns: [t.exhibitId, t.personId] })],
);

export const scene = mysqlTable(
  "scene",
  {
    id: id(),
    exhibitId: ref("exhibit_id")
      .notNull()
      .references(() => exhibit.id),
    position: int("position").notNull(),
    titleEn: words("title_en", 160).notNull(),
    titleFr: words("title_fr", 160),
    /** SceneDocument of app/scene/document.ts. */
    document: json<unknown>("document").notNull(),
    mediaId: ref("media_id").references(() => media.id),
    version: version(),
  },
  // The scenes of an exhibit in their order. Not unique: an order is rewritten in one transaction, row by row.
  (t) => [index("scene_order").on(t.exhibitId, t.position)],
);

export const sceneCast = mysqlTable(
  "scene_cast",
  {
    sceneId: ref("scene_id")
      .notNull()
      .references(() => scene.id),
    recordId: ref("record_id")
      .notNull()
      .references(() => record.id),
    position: int("position").notNull(),
    labelled: boolean("labelled").notNull().default(true),
  },
  (t) => [
    primaryKey({ columns: [t.sceneId, t.recordId] }),
    // Where a record is used.
    index("scene_cast_record").on(t.recordId),
  ],
);

/** A bound number: words refer to it as {key}. */
export const sceneFigure = mysqlTable(
  "scene_figure",
  {
    id: id(),
    sceneId: ref("scene_id")
      .notNull()
      .references(() => scene.id),
    key: exact("figure_key", 40).notNull(),
    recordId: ref("record_id")
      .notNull()
      .references(() => record.id),
    quantity: mysqlEnum("quantity", FIGURE_QUANTITIES).notNull(),
    unit: mysqlEnum("unit", FIGURE_UNITS).notNull(),
    form: mysqlEnum("form", FIGURE_FORMS).notNull(),
  },
  (t) => [
    uniqueIndex("scene_figure_key").on(t.sceneId, t.key),
    // Where a record's numbers are read.
    index("scene_figure_record").on(t.recordId),
  ],
);

export const sceneWords = mysqlTable(
  "scene_words",
  {
    sceneId: ref("scene_id")
      .notNull()
      .references(() => scene.id),
    language: mysqlEnum("language", LANGUAGES).notNull(),
    /** Plain text; blank lines part paragraphs; {key} stands for a figure. */
    body: text("body").notNull(),
  },
  (t) => [primaryKey({ columns: [t.sceneId, t.language] })],
);
