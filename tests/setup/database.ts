import { drizzle } from "drizzle-orm/mysql2";
import { migrate } from "drizzle-orm/mysql2/migrator";
import mysql from "mysql2/promise";
import { afterAll, inject } from "vitest";

// One database a worker: files that run at once never see each other's rows. VITEST_POOL_ID is not unique across
// projects; VITEST_WORKER_ID is.
const server = new URL(inject("databaseServer"));
const name = `app_test_${process.pid}_${process.env.VITEST_WORKER_ID}`;
const own = new URL(server);
own.pathname = `/${name}`;
const mail = inject("mail");

Object.assign(process.env, inject("s3"), {
  NODE_ENV: "test",
  DATABASE_URL: own.href,
  SMTP_URL: mail.url,
  MAIL_CATCHER_DIR: mail.folder,
  SESSION_SECRET: "only-for-tests-only-for-tests-only",
  PUBLIC_URL: "http://127.0.0.1:4999",
});

/** Connections that are open would be left without a database. */
async function closePool(): Promise<void> {
  const { closeDatabase } = await import("#app/database/db.server.ts");
  await closeDatabase();
}

async function makeDatabase(): Promise<void> {
  const connection = await mysql.createConnection(server.href);
  await connection.query(`DROP DATABASE IF EXISTS \`${name}\``);
  await connection.query(`CREATE DATABASE \`${name}\``);
  await connection.query(`USE \`${name}\``);
  await migrate(drizzle({ client: connection }), { migrationsFolder: "drizzle/migrations" });
  await connection.end();
}

/** Makes this worker's database anew, empty and migrated: for a file that must not see what earlier tests left. */
export async function cleanDatabase(): Promise<void> {
  await closePool();
  await makeDatabase();
}

await makeDatabase();

afterAll(async () => {
  await closePool();
  const last = await mysql.createConnection(server.href);
  await last.query(`DROP DATABASE IF EXISTS \`${name}\``);
  await last.end();
});
