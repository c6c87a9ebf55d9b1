import { index, int, mysqlEnum, mysqlTable, uniqueIndex } from "drizzle-orm/mysql-core";
import { createdAt, exact, id, ref, version, words } from "../columns.ts";
import { LANGUAGES } from "../enums.ts";
import { exhibit } from "./exhibits.ts";

export const kiosk = mysqlTable(
  "kiosk",
  {
    id: id(),
    slug: exact("slug", 60).notNull(),
    name: words("name", 120).notNull(),
    /** The place in the gallery where it stands. */
    station: words("station", 160).notNull(),
    exhibitId: ref("exhibit_id").references(() => exhibit.id),
    language: mysqlEnum("language", LANGUAGES).notNull().default("en"),
    /** Seconds without a touch before the page asks, then starts again. */
    idleSeconds: int("idle_seconds").notNull().default(60),
    createdAt: createdAt(),
    version: version(),
  },
  (t) => [
    uniqueIndex("kiosk_slug").on(t.slug),
    // Which kiosks show an exhibit.
    index("kiosk_exhibit").on(t.exhibitId),
  ],
);
