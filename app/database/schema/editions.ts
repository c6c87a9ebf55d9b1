import { int, mysqlTable, uniqueIndex } from "drizzle-orm/mysql-core";
import { bytes, digest, id, instant, json, ref, words } from "../columns.ts";
import { exhibit } from "./exhibits.ts";
import { person } from "./people.ts";
import { seal } from "./review.ts";

/** What was published, for good: triggers refuse UPDATE and DELETE (see the migrations). */
export const edition = mysqlTable(
  "edition",
  {
    id: id(),
    exhibitId: ref("exhibit_id")
      .notNull()
      .references(() => exhibit.id),
    number: int("number").notNull(),
    /** SHA-256 of `content`; equals the digest that was verified and approved. */
    digest: digest("digest").notNull(),
    content: bytes("content").notNull(),
    /** "<scene id>:<language>" -> SHA-256 of its still in storage. */
    stills: json<Record<string, string>>("stills").notNull(),
    sealId: ref("seal_id")
      .notNull()
      .references(() => seal.id),
    publishedBy: ref("published_by")
      .notNull()
      .references(() => person.id),
    publishedAt: instant("published_at").notNull(),
    note: words("note", 1000),
  },
  // Numbered without gaps within an exhibit; two publishers at once cannot take the same number.
  (t) => [uniqueIndex("edition_number").on(t.exhibitId, t.number)],
);
