import { drizzle } from "drizzle-orm/mysql2";
import { migrate } from "drizzle-orm/mysql2/migrator";
import type { RowDataPacket } from "mysql2/promise";
import { takeLocalEnvironment } from "#storage/local-environment.mjs";
import { connectOrExplain } from "./connect.ts";

// npm run db:migrate: brings the database to the newest migration. Two that start at once take turns.
const WAIT_SECONDS = 60;

const connection = await connectOrExplain(takeLocalEnvironment());
try {
  const [rows] = await connection.query<RowDataPacket[]>("SELECT GET_LOCK('alidade_migrate', ?) AS taken", [
    WAIT_SECONDS,
  ]);
  if (rows[0]?.taken !== 1) throw new Error("Another migration of this database does not end.");
  await migrate(drizzle({ client: connection }), { migrationsFolder: "drizzle/migrations" });
} finally {
  await connection.end();
}
