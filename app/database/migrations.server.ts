import { createHash } from "node:crypto";
import { readFile } from "node:fs/promises";
import { join } from "node:path";
import type { RowDataPacket } from "mysql2/promise";
import { connections } from "./db.server.ts";

interface Journal {
  entries: { tag: string; when: number }[];
}

const FOLDER = "drizzle/migrations";

/** The migrations that this version of the program needs, oldest first, with the digest that the migrator records. */
async function neededMigrations(folder: string) {
  const journal: Journal = JSON.parse(await readFile(join(folder, "meta", "_journal.json"), "utf8"));
  return Promise.all(
    journal.entries.map(async ({ tag }) => {
      const sql = await readFile(join(folder, `${tag}.sql`), "utf8");
      return { tag, hash: createHash("sha256").update(sql).digest("hex") };
    }),
  );
}

/** Whether the database has every migration of this version of the program, and none that it does not know. */
export async function migrationsAreCurrent(folder = FOLDER): Promise<{ ok: boolean; detail: string }> {
  const needed = await neededMigrations(folder);
  const [rows] = await connections().query<RowDataPacket[]>("SELECT hash FROM __drizzle_migrations ORDER BY id");
  const applied = new Set(rows.map((row) => String(row.hash)));
  const missing = needed.filter(({ hash }) => !applied.has(hash)).map(({ tag }) => tag);
  if (missing.length > 0) return { ok: false, detail: `missing: ${missing.join(", ")}` };
  if (applied.size > needed.length) {
    return { ok: false, detail: "the database was migrated by a newer version of the program" };
  }
  return { ok: true, detail: `at ${needed.at(-1)?.tag ?? "none"}` };
}
