import { randomUUID } from "node:crypto";
import type { RowDataPacket } from "mysql2/promise";
import { type Check, checked } from "./check.ts";
import { connections } from "./db.server.ts";
import { migrationsAreCurrent } from "./migrations.server.ts";
import { brokenPromises, type DatabaseSettings } from "./promised-settings.ts";

/** Whether the database takes writes, is set as promised, and has the migrations of this version of the program. */
export function checkDatabase(): Promise<Check[]> {
  return Promise.all([
    checked("database writable", writeAndTakeBack),
    checked("database settings", settingsAreAsPromised),
    checked("migrations current", () => migrationsAreCurrent()),
  ]);
}

/** A real write, taken back: a full disk or a read-only server refuses it. */
async function writeAndTakeBack() {
  const connection = await connections().getConnection();
  try {
    await connection.beginTransaction();
    await connection.query("INSERT INTO attempt_limit (`key`, points) VALUES (?, 0)", [`readiness:${randomUUID()}`]);
  } finally {
    await connection.rollback().catch(() => connection.destroy());
    connection.release();
  }
  return { ok: true, detail: "took a row" };
}

async function settingsAreAsPromised() {
  const [rows] = await connections().query<(RowDataPacket & DatabaseSettings & { logBin: number })[]>(
    `SELECT @@read_only AS readOnly, @@sql_mode AS sqlMode, @@collation_database AS collation,
            @@innodb_snapshot_isolation AS snapshotIsolation, @@innodb_flush_log_at_trx_commit AS flushAtCommit,
            @@log_bin AS logBin, @@sync_binlog AS syncBinlog,
            TIMESTAMPDIFF(SECOND, UTC_TIMESTAMP(), NOW()) AS secondsFromUtc`,
  );
  const [settings] = rows;
  if (!settings) return { ok: false, detail: "the settings could not be read" };
  const broken = brokenPromises({ ...settings, syncBinlog: settings.logBin ? settings.syncBinlog : null });
  return broken.length === 0 ? { ok: true, detail: "as promised" } : { ok: false, detail: broken.join("; ") };
}
