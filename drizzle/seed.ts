import { writeFileSync } from "node:fs";
import { join } from "node:path";
import { closeDatabase, db } from "#app/database/db.server.ts";
import { person } from "#app/database/schema/people.ts";
import { env } from "#app/env.server.ts";
import "#app/review/register.server.ts";
import { ACCOUNTS, DEMO_PASSWORD, openAccounts } from "./seed/accounts.ts";
import { keepCatalogue } from "./seed/catalogue.ts";
import { buildExhibit, FAMILIAR_PATTERN, NEAREST_SUNS } from "./seed/exhibits.ts";
import { DEMO_KIOSK, release } from "./seed/release.ts";

/** Loads the demo once: everything goes through the verbs that people use, so that it obeys every rule. */
async function seed(): Promise<void> {
  const { hostname } = new URL(env().DATABASE_URL);
  if (!["127.0.0.1", "localhost", "::1", "[::1]"].includes(hostname)) {
    throw new Error(
      `The demo has known passwords, so it is loaded only into a database on this machine, not ${hostname}.`,
    );
  }
  const [somebody] = await db().select({ id: person.id }).from(person).limit(1);
  if (somebody) {
    console.log("There are people in this database already; the demo is not loaded again.");
    return;
  }
  const team = await openAccounts();
  const catalogue = await keepCatalogue(team);
  await release(team, await buildExhibit(team, catalogue, NEAREST_SUNS));
  await buildExhibit(team, catalogue, FAMILIAR_PATTERN);
  const words = accountWords();
  console.log(words);
  if (process.env.ALIDADE_VAR) writeFileSync(join(process.env.ALIDADE_VAR, "demo-accounts.txt"), words);
}

function accountWords(): string {
  const { PUBLIC_URL } = env();
  return [
    `Demo accounts of Tern Point Science Centre (password of all: ${DEMO_PASSWORD})`,
    ...ACCOUNTS.map(({ name, email, roles }) => `  ${email.padEnd(28)} ${roles.join(", ").padEnd(10)} ${name}`),
    `Demo kiosk: ${PUBLIC_URL}/k/${DEMO_KIOSK}`,
    `Demo feed:  ${PUBLIC_URL}/feed/${NEAREST_SUNS.slug}.json`,
    "",
  ].join("\n");
}

try {
  await seed();
} finally {
  await closeDatabase();
}
