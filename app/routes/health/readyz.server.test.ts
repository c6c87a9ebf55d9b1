import mysql from "mysql2/promise";
import { afterEach, expect, test, vi } from "vitest";
import { closeDatabase, connections } from "#app/database/db.server.ts";
import * as store from "#app/media/object-store.server.ts";
import { loader } from "./readyz.ts";

afterEach(() => vi.restoreAllMocks());

async function readyz() {
  const response = await loader();
  return { status: response.status, body: await response.json() };
}

test("names the promised setting that the database of the tests does without, and finds the rest well", async () => {
  const { status, body } = await readyz();
  expect(status).toBe(503);
  expect(body).toEqual({
    status: "not ready",
    checks: {
      writable: { ok: true },
      // The tests' own database saves the time of flushing at every commit.
      settings: { ok: false, why: "Not as promised: innodb_flush_log_at_trx_commit is 0." },
      migrations: { ok: true },
      bucket: { ok: true },
    },
  });
});

test("the probe leaves no row behind", async () => {
  await readyz();
  const [rows] = await connections().query("SELECT 1 FROM attempt_limit WHERE `key` LIKE 'readiness:%'");
  expect(rows).toEqual([]);
});

test("names a migration that was not applied", async () => {
  const connection = await mysql.createConnection(process.env.DATABASE_URL ?? "");
  const [rows] = await connection.query<mysql.RowDataPacket[]>(
    "SELECT * FROM __drizzle_migrations ORDER BY created_at LIMIT 1",
  );
  const first = rows[0];
  await connection.query("DELETE FROM __drizzle_migrations WHERE id = ?", [first?.id]);
  try {
    expect((await readyz()).body.checks.migrations).toEqual({ ok: false, why: "Not applied yet: 0000_initial." });
  } finally {
    await connection.query("INSERT INTO __drizzle_migrations SET ?", [first]);
    await connection.end();
  }
});

test("says that the database is ahead of this build", async () => {
  await connections().query("INSERT INTO __drizzle_migrations (hash, created_at) VALUES ('newer', 9999999999999)");
  try {
    expect((await readyz()).body.checks.migrations).toEqual({
      ok: false,
      why: "The database has migrations that this build does not know: 1.",
    });
  } finally {
    await connections().query("DELETE FROM __drizzle_migrations WHERE hash = 'newer'");
  }
});

test("says that the bucket cannot be reached", async () => {
  vi.spyOn(store, "probeBucket").mockRejectedValue(new Error("away"));
  expect((await readyz()).body.checks.bucket).toEqual({ ok: false, why: "The bucket cannot be reached." });
});

test("says that the database does not answer when it is away", async () => {
  await closeDatabase();
  vi.spyOn(mysql, "createPool").mockReturnValue({
    getConnection: () => Promise.reject(new Error("ECONNREFUSED")),
    end: async () => {},
  } as unknown as mysql.Pool);
  const { status, body } = await readyz();
  await closeDatabase();
  expect(status).toBe(503);
  expect(body.checks.writable).toEqual({ ok: false, why: "The database does not answer." });
});
