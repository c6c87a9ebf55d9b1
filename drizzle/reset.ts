import { isLocalDatabase, takeLocalEnvironment } from "#storage/local-environment.mjs";
import { connectOrExplain } from "./connect.ts";

// npm run db:reset: empties the local database and migrates it again. Everything in it is lost, so it wants a yes.
const url = new URL(takeLocalEnvironment());
const name = url.pathname.slice(1);
if (!isLocalDatabase(url.href) || !/^app(_\w+)?$/.test(name)) {
  console.error(`This only empties the database of this machine, not ${name} on ${url.hostname}.`);
  process.exit(1);
}
if (process.env.ALIDADE_RESET !== "yes" && !process.argv.includes("--yes")) {
  console.error("This deletes everything in the local database. To do so: npm run db:reset -- --yes");
  process.exit(1);
}
const server = new URL(url);
server.pathname = "";
const connection = await connectOrExplain(server.href);
await connection.query(`DROP DATABASE IF EXISTS \`${name}\``);
await connection.query(`CREATE DATABASE \`${name}\``);
await connection.end();
await import("./migrate.ts");
