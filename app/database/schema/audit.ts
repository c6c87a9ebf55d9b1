import { index, mysqlTable } from "drizzle-orm/mysql-core";
import { exact, id, instant, json, ref, words } from "../columns.ts";

export const auditEntry = mysqlTable(
  "audit_entry",
  {
    id: id(),
    at: instant("at").notNull(),
    /** null: the program itself (seed, worker). No foreign key: history outlives everything it speaks of. */
    personId: ref("person_id"),
    /** The name as it was then. */
    personName: words("person_name", 120).notNull(),
    verb: exact("verb", 80).notNull(),
    objectType: exact("object_type", 40).notNull(),
    objectId: ref("object_id").notNull(),
    /** What the object is called, for reading the log without it. */
    objectName: words("object_name", 200).notNull(),
    before: json<unknown>("before_state"),
    after: json<unknown>("after_state"),
    note: words("note", 1000),
    requestId: exact("request_id", 40).notNull().default(""),
  },
  (t) => [
    // The page of one object's history, newest first.
    index("audit_object").on(t.objectType, t.objectId, t.id),
    // What one person did, newest first.
    index("audit_person").on(t.personId, t.id),
  ],
);
