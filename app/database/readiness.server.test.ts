import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, test, vi } from "vitest";
import { connections } from "./db.server.ts";
import { migrationsAreCurrent } from "./migrations.server.ts";
import { checkDatabase } from "./readiness.server.ts";

const named = async (name: string) => (await checkDatabase()).find((check) => check.name === name);

test("a database that takes a row is writable, and the row is not kept", async () => {
  expect(await named("database writable")).toMatchObject({ ok: true });
  const [rows] = await connections().query("SELECT * FROM attempt_limit WHERE `key` LIKE 'readiness:%'");
  expect(rows).toEqual([]);
});

test("settings that are not as promised are named", async () => {
  // The tests' own server does without durability (tests/setup/services.ts), and so it must not pass for ready.
  const check = await named("database settings");
  expect(check).toEqual({
    name: "database settings",
    ok: false,
    detail: "innodb_flush_log_at_trx_commit is 0",
  });
});

test("a database with every migration is current", async () => {
  expect(await migrationsAreCurrent()).toMatchObject({ ok: true });
});

test("a migration that the database lacks is named", async () => {
  const folder = mkdtempSync(join(tmpdir(), "migrations-"));
  cpSync("drizzle/migrations", folder, { recursive: true });
  const journal = JSON.parse(readFileSync(join(folder, "meta", "_journal.json"), "utf8"));
  journal.entries.push({ tag: "9999_later", when: Date.now() });
  writeFileSync(join(folder, "meta", "_journal.json"), JSON.stringify(journal));
  writeFileSync(join(folder, "9999_later.sql"), "SELECT 1;");
  expect(await migrationsAreCurrent(folder)).toEqual({ ok: false, detail: "missing: 9999_later" });
  rmSync(folder, { recursive: true });
});

test("a database of a newer version of the program is not current", async () => {
  await connections().query("INSERT INTO __drizzle_migrations (hash, created_at) VALUES ('newer', 9999999999999)");
  expect(await migrationsAreCurrent()).toMatchObject({ ok: false, detail: expect.stringContaining("newer version") });
  await connections().query("DELETE FROM __drizzle_migrations WHERE hash = 'newer'");
});

test("a database that is away fails every check with the reason", async () => {
  const pool = connections();
  const away = new Error("connect ECONNREFUSED");
  vi.spyOn(pool, "getConnection").mockRejectedValue(away);
  vi.spyOn(pool, "query").mockRejectedValue(away);
  expect((await checkDatabase()).map(({ ok, detail }) => [ok, detail])).toEqual([
    [false, "connect ECONNREFUSED"],
    [false, "connect ECONNREFUSED"],
    [false, "connect ECONNREFUSED"],
  ]);
});
