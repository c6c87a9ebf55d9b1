import { index, mysqlEnum, mysqlTable } from "drizzle-orm/mysql-core";
import { bytes, digest, id, instant, json, ref, words } from "../columns.ts";
import { SEAL_KINDS } from "../enums.ts";
import { exhibit } from "./exhibits.ts";
import { person } from "./people.ts";

/** One sign-off: who saw which bytes, and whether it still holds. */
export const seal = mysqlTable(
  "seal",
  {
    id: id(),
    exhibitId: ref("exhibit_id")
      .notNull()
      .references(() => exhibit.id),
    kind: mysqlEnum("kind", SEAL_KINDS).notNull(),
    digest: digest("digest").notNull(),
    /** RFC 8785 canonical JSON of the resolved content, exactly what the digest is of. */
    content: bytes("content").notNull(),
    personId: ref("person_id")
      .notNull()
      .references(() => person.id),
    signedAt: instant("signed_at").notNull(),
    note: words("note", 1000),
    voidedAt: instant("voided_at"),
    /** What moved, old and new, when it was voided (review/compare-content.ts). */
    voidReason: json<unknown>("void_reason"),
  },
  // An exhibit's seals, newest first; those with voided_at null hold.
  (t) => [index("seal_exhibit").on(t.exhibitId, t.id)],
);
