import { index, int, mysqlEnum, mysqlTable, uniqueIndex } from "drizzle-orm/mysql-core";
import { createdAt, digest, exact, id, ref, version, words } from "../columns.ts";
import { LICENCES, VARIANT_FORMATS } from "../enums.ts";
import { person } from "./people.ts";

export const media = mysqlTable(
  "media",
  {
    id: id(),
    /** SHA-256 of the original bytes; also its key in storage. */
    digest: digest("digest").notNull(),
    fileName: words("file_name", 200).notNull(),
    mime: exact("mime", 60).notNull(),
    bytes: int("bytes", { unsigned: true }).notNull(),
    width: int("width").notNull(),
    height: int("height").notNull(),
    creator: words("creator", 200).notNull(),
    creditLine: words("credit_line", 300).notNull(),
    licence: mysqlEnum("licence", LICENCES).notNull(),
    altEn: words("alt_en", 500).notNull(),
    altFr: words("alt_fr", 500),
    createdBy: ref("created_by")
      .notNull()
      .references(() => person.id),
    createdAt: createdAt(),
    version: version(),
  },
  // The same picture sent twice is one medium.
  (t) => [uniqueIndex("media_digest").on(t.digest)],
);

export const mediaVariant = mysqlTable(
  "media_variant",
  {
    id: id(),
    mediaId: ref("media_id")
      .notNull()
      .references(() => media.id),
    format: mysqlEnum("format", VARIANT_FORMATS).notNull(),
    width: int("width").notNull(),
    height: int("height").notNull(),
    bytes: int("bytes", { unsigned: true }).notNull(),
    digest: digest("digest").notNull(),
  },
  (t) => [
    // A picture's <source> list, by format and width.
    uniqueIndex("media_variant_size").on(t.mediaId, t.format, t.width),
    // Served by digest.
    index("media_variant_digest").on(t.digest),
  ],
);
