/** How the database is set, as it says itself. */
export interface DatabaseSettings {
  readOnly: number;
  sqlMode: string;
  collation: string;
  snapshotIsolation: number;
  flushAtCommit: number;
  /** null where no binary log is kept. */
  syncBinlog: number | null;
  /** Between the clock that NOW() reads and UTC. */
  secondsFromUtc: number;
}

/**
 * The settings without which our promises do not hold: nothing that was committed is lost, a lost update is an error,
 * text keeps every character, times are UTC.
 * @returns those that are otherwise, each with what it is; empty when all is well
 */
export function brokenPromises(settings: DatabaseSettings): string[] {
  const { readOnly, sqlMode, collation, snapshotIsolation, flushAtCommit, syncBinlog, secondsFromUtc } = settings;
  const promises: [name: string, kept: boolean, value: string | number | null][] = [
    ["read_only", readOnly === 0, readOnly],
    ["sql_mode", sqlMode.split(",").includes("STRICT_TRANS_TABLES"), sqlMode],
    ["collation_database", collation.startsWith("utf8mb4_"), collation],
    ["innodb_snapshot_isolation", snapshotIsolation === 1, snapshotIsolation],
    ["innodb_flush_log_at_trx_commit", flushAtCommit === 1, flushAtCommit],
    ["sync_binlog", syncBinlog === null || syncBinlog === 1, syncBinlog],
    ["seconds from UTC", secondsFromUtc === 0, secondsFromUtc],
  ];
  return promises.filter(([, kept]) => !kept).map(([name, , value]) => `${name} is ${value}`);
}
