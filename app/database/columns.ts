import { customType, datetime, int, varchar } from "drizzle-orm/mysql-core";
import { newId } from "./new-id.ts";

const asciiId = customType<{ data: string; driverData: string }>({
  dataType: () => "varchar(26) character set ascii collate ascii_bin",
});

const jsonText = customType<{ data: unknown; driverData: string }>({
  dataType: () => "longtext",
  toDriver: (value) => JSON.stringify(value),
  fromDriver: (value) => (typeof value === "string" ? JSON.parse(value) : value),
});

const longBlob = customType<{ data: Buffer; driverData: Buffer }>({ dataType: () => "longblob" });

const exactText = (length: number) =>
  customType<{ data: string; driverData: string }>({
    dataType: () => `varchar(${length}) character set utf8mb4 collate utf8mb4_bin`,
  });

/** Primary key: a ULID made in code, so that a row's id is known before it is written and sorts by time. */
export const id = () =>
  asciiId("id")
    .primaryKey()
    .$defaultFn(() => newId());

/** A column that holds another row's id. */
export const ref = (name: string) => asciiId(name);

/** A moment in UTC to the millisecond. */
export const instant = (name: string) => datetime(name, { mode: "date", fsp: 3 });

export const createdAt = () =>
  instant("created_at")
    .notNull()
    .$defaultFn(() => new Date());

/** Counts saves; every update compares and sets it, so that nobody overwrites what they have not seen. */
export const version = () => int("version").notNull().default(1);

/** A number as its author printed it ("100.0" and "100.00" stay different). */
export const decimalText = (name: string) => exactText(64)(name);

/** Text compared to the letter: digests, tokens, catalogue identifiers. */
export const exact = (name: string, length: number) => exactText(length)(name);

/** A SHA-256 as 64 hex digits. */
export const digest = (name: string) => exactText(64)(name);

export const json = <T>(name: string) => jsonText(name).$type<T>();

/** Bytes that are kept exactly as they were signed or sent. */
export const bytes = (name: string) => longBlob(name);

export const words = (name: string, length = 255) => varchar(name, { length });
