import { closeDatabase } from "#app/database/db.server.ts";
import { takeLocalEnvironment } from "#storage/local-environment.mjs";
import { VAR } from "#storage/paths.mjs";
import { DemoRefused, loadDemo } from "./seed/load-demo.ts";

// npm run db:seed: loads the demo of Tern Point into a database in which nobody is yet.
takeLocalEnvironment();
try {
  console.log(await loadDemo(VAR));
} catch (error) {
  console.error(error instanceof DemoRefused ? error.message : error);
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
