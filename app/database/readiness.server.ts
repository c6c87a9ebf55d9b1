import { randomUUID } from "node:crypto";
import type { PoolConnection, RowDataPacket } from "mysql2/promise";
import journal from "#drizzle/migrations/meta/_journal.json";
import { connections } from "./db.server.ts";
import { brokenPromises, type DatabaseSettings } from "./promised-settings.ts";

/** One part of what /readyz answers: well, or what is wrong in words that give no secret away. */
export type Finding = { ok: true } | { ok: false; why: string };

export interface DatabaseReadiness {
  writable: Finding;
  settings: Finding;
  migrations: Finding;
}

const WELL: Finding = { ok: true };
const wrong = (why: string): Finding => ({ ok: false, why });

/** Whether the database takes writes, is set as promised, and has exactly the migrations that this build knows. */
export async function readDatabaseReadiness(): Promise<DatabaseReadiness> {
  const away = wrong("The database does not answer.");
  const connection = await connections()
    .getConnection()
    .catch(() => null);
  if (!connection) return { writable: away, settings: away, migrations: away };
  try {
    return {
      writable: await probeWrite(connection).catch(() => wrong("The database refuses to write.")),
      settings: await probeSettings(connection).catch(() => wrong("The settings could not be read.")),
      migrations: await probeMigrations(connection).catch(() => wrong("No migration was ever applied.")),
    };
  } finally {
    connection.release();
  }
}

/** A real write, taken back: a full disk or a read-only server refuses it. */
async function probeWrite(connection: PoolConnection): Promise<Finding> {
  await connection.beginTransaction();
  try {
    await connection.query("INSERT INTO attempt_limit (`key`, points) VALUES (?, 0)", [`readiness:${randomUUID()}`]);
  } finally {
    await connection.rollback();
  }
  return WELL;
}

async function probeSettings(connection: PoolConnection): Promise<Finding> {
  const [rows] = await connection.query<(RowDataPacket & DatabaseSettings & { logBin: number })[]>(
    `SELECT @@read_only AS readOnly, @@sql_mode AS sqlMode, @@collation_database AS collation,
            @@innodb_snapshot_isolation AS snapshotIsolation, @@innodb_flush_log_at_trx_commit AS flushAtCommit,
            @@log_bin AS logBin, @@sync_binlog AS syncBinlog,
            TIMESTAMPDIFF(SECOND, UTC_TIMESTAMP(), NOW()) AS secondsFromUtc`,
  );
  const [settings] = rows;
  if (!settings) return wrong("The settings could not be read.");
  const broken = brokenPromises({ ...settings, syncBinlog: settings.logBin ? settings.syncBinlog : null });
  return broken.length === 0 ? WELL : wrong(`Not as promised: ${broken.join("; ")}.`);
}

async function probeMigrations(connection: PoolConnection): Promise<Finding> {
  const [rows] = await connection.query<(RowDataPacket & { created_at: number })[]>(
    "SELECT created_at FROM __drizzle_migrations",
  );
  const applied = new Set(rows.map((row) => Number(row.created_at)));
  const missing = journal.entries.filter((entry) => !applied.delete(entry.when));
  if (missing.length > 0) return wrong(`Not applied yet: ${missing.map((entry) => entry.tag).join(", ")}.`);
  return applied.size === 0
    ? WELL
    : wrong(`The database has migrations that this build does not know: ${applied.size}.`);
}
