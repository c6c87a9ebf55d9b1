import { existsSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { db } from "#app/database/db.server.ts";
import { person } from "#app/database/schema/people.ts";
import { env } from "#app/env.server.ts";
// A vetted record or a published exhibit wakes whoever reads it in a seal.
import "#app/review/register.server.ts";
import { isLocalDatabase } from "#storage/local-environment.mjs";
import { ACCOUNTS, DEMO_PASSWORD, openAccounts } from "./accounts.ts";
import { keepCatalogue } from "./catalogue.ts";
import { buildExhibit, FAMILIAR_PATTERN, NEAREST_SUNS } from "./exhibits.ts";
import { DEMO_KIOSK, release } from "./release.ts";

/** Why the demo is not loaded, in a sentence for the person who asked. */
export class DemoRefused extends Error {}

/** The file whose presence says that a demo was loaded whole. */
export const ACCOUNTS_FILE = "demo-accounts.txt";

/**
 * Loads the demo once, through the verbs that people use, so that it obeys every rule.
 * @param folder takes the accounts file
 * @returns what to tell the person who asked for it
 * @throws DemoRefused where it may not be loaded, or was not loaded whole
 */
export async function loadDemo(folder: string): Promise<string> {
  const { DATABASE_URL } = env();
  if (!isLocalDatabase(DATABASE_URL)) {
    const { hostname } = new URL(DATABASE_URL);
    throw new DemoRefused(
      `The demo has known passwords, so it is loaded only into a database on this machine, not ${hostname}.`,
    );
  }
  const file = join(folder, ACCOUNTS_FILE);
  const [somebody] = await db().select({ id: person.id }).from(person).limit(1);
  if (somebody && existsSync(file)) return "There are people in this database already; the demo is not loaded again.";
  if (somebody) {
    throw new DemoRefused(
      "There are people in this database, but no demo was loaded whole: if nobody has worked in it, empty it with " +
        "npm run db:reset -- --yes and load the demo again.",
    );
  }
  rmSync(file, { force: true });
  await loadAll();
  const words = accountWords();
  writeFileSync(file, words);
  return words;
}

async function loadAll(): Promise<void> {
  const team = await openAccounts();
  const catalogue = await keepCatalogue(team);
  await release(team, await buildExhibit(team, catalogue, NEAREST_SUNS));
  await buildExhibit(team, catalogue, FAMILIAR_PATTERN);
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
