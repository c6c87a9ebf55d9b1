import { drizzle, type MySql2Database, type MySql2Transaction } from "drizzle-orm/mysql2";
import mysql from "mysql2/promise";
import { env } from "#app/env.server.ts";

type NoRelations = Record<string, never>;
export type Database = MySql2Database<NoRelations>;
// biome-ignore lint/complexity/noBannedTypes: the shape that drizzle gives a schema without relations
export type Transaction = MySql2Transaction<NoRelations, {}>;
/** Reads take either, so that a verb can read inside its own transaction. */
export type Reader = Database | Transaction;

let pool: mysql.Pool | undefined;
let database: Database | undefined;

/** The connection pool, opened at first use. Times are UTC on both sides; a lost update is error 1020, not silence. */
export function connections(): mysql.Pool {
  if (pool) return pool;
  pool = mysql.createPool({
    uri: env().DATABASE_URL,
    timezone: "Z",
    supportBigNumbers: true,
    connectionLimit: 10,
    charset: "utf8mb4",
  });
  return pool;
}

export function db(): Database {
  database ??= drizzle({ client: connections() });
  return database;
}

export async function closeDatabase(): Promise<void> {
  await pool?.end();
  pool = undefined;
  database = undefined;
}
