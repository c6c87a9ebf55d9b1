import { bigint, index, int, mysqlEnum, mysqlTable, primaryKey, uniqueIndex, varchar } from "drizzle-orm/mysql-core";
import { createdAt, digest, exact, id, instant, ref, version, words } from "../columns.ts";
import { LINK_PURPOSES, PERSON_STATES, ROLES } from "../enums.ts";

export const person = mysqlTable(
  "person",
  {
    id: id(),
    email: words("email", 254).notNull(),
    name: words("name", 120).notNull(),
    /** argon2id, PHC string. null until the invitation is answered. */
    passwordHash: exact("password_hash", 255),
    state: mysqlEnum("state", PERSON_STATES).notNull().default("invited"),
    createdAt: createdAt(),
    version: version(),
  },
  // Signing in looks a person up by address; the collation makes it case-insensitive.
  (t) => [uniqueIndex("person_email").on(t.email)],
);

export const personRole = mysqlTable(
  "person_role",
  {
    personId: ref("person_id")
      .notNull()
      .references(() => person.id),
    role: mysqlEnum("role", ROLES).notNull(),
  },
  (t) => [primaryKey({ columns: [t.personId, t.role] })],
);

export const session = mysqlTable(
  "session",
  {
    id: id(),
    /** SHA-256 of the cookie's token: a stolen table opens no door. */
    tokenHash: digest("token_hash").notNull(),
    personId: ref("person_id")
      .notNull()
      .references(() => person.id),
    createdAt: createdAt(),
    /** Moves with use, at most once a minute; the idle limit counts from here. */
    lastSeenAt: instant("last_seen_at").notNull(),
    /** The absolute limit, fixed at sign-in. */
    expiresAt: instant("expires_at").notNull(),
    revokedAt: instant("revoked_at"),
    address: words("address", 64).notNull().default(""),
    userAgent: words("user_agent", 400).notNull().default(""),
  },
  (t) => [
    // Every request finds its session by the hash.
    uniqueIndex("session_token").on(t.tokenHash),
    // A person's list of sessions, and revoking them all.
    index("session_person").on(t.personId),
  ],
);

export const oneTimeLink = mysqlTable(
  "one_time_link",
  {
    id: id(),
    tokenHash: digest("token_hash").notNull(),
    personId: ref("person_id")
      .notNull()
      .references(() => person.id),
    purpose: mysqlEnum("purpose", LINK_PURPOSES).notNull(),
    createdAt: createdAt(),
    expiresAt: instant("expires_at").notNull(),
    usedAt: instant("used_at"),
  },
  (t) => [
    // The link in the mail is looked up by its hash.
    uniqueIndex("one_time_link_token").on(t.tokenHash),
    // A new link ends the older ones of the same person and purpose.
    index("one_time_link_person").on(t.personId, t.purpose),
  ],
);

/** Kept by the rate limiter (people/limits.server.ts), which dictates its shape. */
export const attemptLimit = mysqlTable("attempt_limit", {
  /** "<rule>:<SHA-256 of account or address, shortened>" */
  key: varchar("key", { length: 255 }).primaryKey(),
  points: int("points").notNull().default(0),
  /** Milliseconds since 1970. */
  expire: bigint("expire", { mode: "number", unsigned: true }),
});
