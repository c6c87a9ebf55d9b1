import { closeDatabase } from "#app/database/db.server.ts";
import { AppError } from "#app/errors.ts";
import { parseInput } from "#app/parse-input.ts";
import { FirstAdmin } from "#app/people/input.ts";
import { inviteFirstAdmin } from "#app/people/invite-first-admin.server.ts";
import { takeLocalEnvironment } from "#storage/local-environment.mjs";

// For an installation without the demo: npx tsx drizzle/first-admin.ts ADDRESS "FULL NAME"
// The invitation goes out by mail as soon as the worker runs.

takeLocalEnvironment();
const [address = "", name = ""] = process.argv.slice(2);
try {
  await inviteFirstAdmin(parseInput(FirstAdmin, { email: address, name }));
  console.log(`The invitation for ${name} is on its way to ${address}.`);
} catch (error) {
  if (!(error instanceof AppError)) throw error;
  console.error(`${error.message} Usage: npx tsx drizzle/first-admin.ts ADDRESS "FULL NAME"`);
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
