import { expect, test } from "vitest";
import { brokenPromises, type DatabaseSettings } from "./promised-settings.ts";

const asPromised: DatabaseSettings = {
  readOnly: 0,
  sqlMode: "STRICT_TRANS_TABLES,NO_ENGINE_SUBSTITUTION",
  collation: "utf8mb4_unicode_520_ci",
  snapshotIsolation: 1,
  flushAtCommit: 1,
  syncBinlog: 1,
  secondsFromUtc: 0,
};

test("a database set as promised breaks nothing, with or without a binary log", () => {
  expect(brokenPromises(asPromised)).toEqual([]);
  expect(brokenPromises({ ...asPromised, syncBinlog: null })).toEqual([]);
});

test.each<[string, Partial<DatabaseSettings>]>([
  ["read_only is 1", { readOnly: 1 }],
  ["sql_mode is NO_ENGINE_SUBSTITUTION", { sqlMode: "NO_ENGINE_SUBSTITUTION" }],
  ["collation_database is latin1_swedish_ci", { collation: "latin1_swedish_ci" }],
  ["innodb_snapshot_isolation is 0", { snapshotIsolation: 0 }],
  ["innodb_flush_log_at_trx_commit is 2", { flushAtCommit: 2 }],
  ["sync_binlog is 0", { syncBinlog: 0 }],
  ["seconds from UTC is 3600", { secondsFromUtc: 3600 }],
])("%s is said when it is set so", (said, other) => {
  expect(brokenPromises({ ...asPromised, ...other })).toEqual([said]);
});
