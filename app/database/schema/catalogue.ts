import { boolean, double, index, int, mysqlEnum, mysqlTable, text, uniqueIndex } from "drizzle-orm/mysql-core";
import { createdAt, decimalText, digest, exact, id, instant, json, ref, version, words } from "../columns.ts";
import {
  INTAKE_STATES,
  LANGUAGES,
  MEASUREMENT_STATES,
  PRIORS,
  QUANTITIES,
  RECORD_KINDS,
  RECORD_STATES,
} from "../enums.ts";
import { person } from "./people.ts";

export const source = mysqlTable(
  "source",
  {
    id: id(),
    /** The catalogue's own designation, such as "I/311". */
    designation: words("designation", 80),
    title: words("title", 400).notNull(),
    authors: words("authors", 400).notNull(),
    year: int("year").notNull(),
    bibcode: exact("bibcode", 19),
    doi: exact("doi", 200),
    note: text("note"),
    createdBy: ref("created_by")
      .notNull()
      .references(() => person.id),
    createdAt: createdAt(),
    version: version(),
  },
  (t) => [
    // One publication, one source.
    uniqueIndex("source_bibcode").on(t.bibcode),
    uniqueIndex("source_doi").on(t.doi),
  ],
);

/**
 * A star or other object. `record_` columns from `regime` on are derived from the adopted parallax by the verb that
 * adopts it, kept for the table's sorting; nobody types them.
 */
export const record = mysqlTable(
  "record",
  {
    id: id(),
    kind: mysqlEnum("kind", RECORD_KINDS).notNull(),
    /** The preferred name in English; other names and languages stand in record_name. */
    name: words("name", 120).notNull(),
    state: mysqlEnum("state", RECORD_STATES).notNull().default("draft"),
    /** As the catalogue printed it. */
    raText: exact("ra_text", 40),
    decText: exact("dec_text", 40),
    raDeg: double("ra_deg"),
    decDeg: double("dec_deg"),
    /** Julian epoch of the position in years, ICRS. */
    positionEpoch: decimalText("position_epoch"),
    positionSourceId: ref("position_source_id").references(() => source.id),
    positionLocator: words("position_locator", 200),
    positionNote: words("position_note", 500),
    /** measurement.id of the parallax that counts; no foreign key, since measurement refers back here. */
    adoptedParallaxId: ref("adopted_parallax_id"),
    adoptedReason: words("adopted_reason", 1000),
    adoptedBy: ref("adopted_by").references(() => person.id),
    adoptedAt: instant("adopted_at"),
    prior: mysqlEnum("prior", PRIORS),
    /** EDSD length, or the limit of a uniform prior, in parsec. */
    priorScalePc: double("prior_scale_pc"),
    priorReason: words("prior_reason", 1000),
    regime: mysqlEnum("regime", ["firm", "wide", "prior-led"]),
    distanceMethod: mysqlEnum("distance_method", ["inverse", ...PRIORS]),
    distancePc: double("distance_pc"),
    distanceLowPc: double("distance_low_pc"),
    distanceHighPc: double("distance_high_pc"),
    vettedBy: ref("vetted_by").references(() => person.id),
    vettedAt: instant("vetted_at"),
    createdBy: ref("created_by")
      .notNull()
      .references(() => person.id),
    createdAt: createdAt(),
    version: version(),
  },
  (t) => [
    // The table's default order and its keyset paging.
    index("record_name_order").on(t.name, t.id),
    // Sorting the table by distance.
    index("record_distance_order").on(t.distancePc, t.id),
    // The desk's list of what waits for vetting.
    index("record_state").on(t.state, t.id),
  ],
);

/** Further names: other languages, Bayer names, older names. */
export const recordName = mysqlTable(
  "record_name",
  {
    id: id(),
    recordId: ref("record_id")
      .notNull()
      .references(() => record.id),
    name: words("name", 120).notNull(),
    /** null: the same in every language (Bayer and catalogue-like names). */
    language: mysqlEnum("language", LANGUAGES),
    preferred: boolean("preferred").notNull().default(false),
  },
  (t) => [
    index("record_name_record").on(t.recordId),
    // Search by any name.
    index("record_name_text").on(t.name),
  ],
);

export const recordIdentifier = mysqlTable(
  "record_identifier",
  {
    id: id(),
    recordId: ref("record_id")
      .notNull()
      .references(() => record.id),
    /** "HIP", "HD", "Gaia DR3"... */
    catalogue: exact("catalogue", 40).notNull(),
    value: exact("value", 60).notNull(),
  },
  (t) => [
    // One object, one identifier: a second record with it is refused.
    uniqueIndex("record_identifier_unique").on(t.catalogue, t.value),
    index("record_identifier_record").on(t.recordId),
    index("record_identifier_value").on(t.value),
  ],
);

export const measurement = mysqlTable(
  "measurement",
  {
    id: id(),
    recordId: ref("record_id")
      .notNull()
      .references(() => record.id),
    quantity: mysqlEnum("quantity", QUANTITIES).notNull(),
    /** Word for word as the source prints it, value and error together or as the file's cells. */
    rawText: exact("raw_text", 200).notNull(),
    /** Decimal strings in `unit`, digits kept. */
    value: decimalText("value").notNull(),
    error: decimalText("error"),
    unit: exact("unit", 24).notNull(),
    /** The same in the quantity's canonical unit (mas, mas/yr, km/s, mag), for computing. */
    valueCanonical: double("value_canonical").notNull(),
    errorCanonical: double("error_canonical"),
    epoch: decimalText("epoch"),
    sourceId: ref("source_id").references(() => source.id),
    /** Where in the source: table, column, row. */
    locator: words("locator", 200),
    /** true: nobody has compared it with the source yet. */
    fromMemory: boolean("from_memory").notNull().default(false),
    note: words("note", 1000),
    state: mysqlEnum("state", MEASUREMENT_STATES).notNull().default("proposed"),
    stateReason: words("state_reason", 1000),
    enteredBy: ref("entered_by")
      .notNull()
      .references(() => person.id),
    intakeId: ref("intake_id"),
    createdAt: createdAt(),
    version: version(),
  },
  (t) => [
    // The ledger of one record.
    index("measurement_record").on(t.recordId, t.quantity),
    // A source's used-by list.
    index("measurement_source").on(t.sourceId),
  ],
);

export const intake = mysqlTable(
  "intake",
  {
    id: id(),
    fileName: words("file_name", 200).notNull(),
    digest: digest("digest").notNull(),
    bytes: int("bytes", { unsigned: true }).notNull(),
    format: mysqlEnum("format", ["csv", "votable"]).notNull(),
    /** Storage key of the file as it came. */
    storageKey: exact("storage_key", 200).notNull(),
    /** Column name in the file -> what it means here (catalogue/intake/mapping.ts). */
    mapping: json<unknown>("mapping").notNull(),
    sourceId: ref("source_id").references(() => source.id),
    state: mysqlEnum("state", INTAKE_STATES).notNull().default("uploaded"),
    rowCount: int("row_count").notNull().default(0),
    createdCount: int("created_count").notNull().default(0),
    updatedCount: int("updated_count").notNull().default(0),
    sameCount: int("same_count").notNull().default(0),
    badCount: int("bad_count").notNull().default(0),
    createdBy: ref("created_by")
      .notNull()
      .references(() => person.id),
    createdAt: createdAt(),
    appliedAt: instant("applied_at"),
    version: version(),
  },
  // The list of intakes, newest first, and finding the same file again.
  (t) => [index("intake_digest").on(t.digest)],
);
