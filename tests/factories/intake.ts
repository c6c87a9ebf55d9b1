import type { Actor } from "#app/audit/actor.ts";
import { applyIntake } from "#app/catalogue/intake/apply-intake.server.ts";
import { readIntake } from "#app/catalogue/intake/read-intakes.server.ts";
import { saveMapping } from "#app/catalogue/intake/save-mapping.server.ts";
import { uploadTable } from "#app/catalogue/intake/upload-table.server.ts";
import { newId } from "#app/database/new-id.ts";
import { makeSource } from "./catalogue.ts";

/** Names of one test are not those of another. */
export const named = () => `T${newId().slice(-8)}`;

export const upload = (actor: Actor, text: string) =>
  uploadTable(actor, { fileName: "table.csv", bytes: new TextEncoder().encode(text) });

/** Columns as they were recognised; the rest as a curator would fill it in. */
export async function map(actor: Actor, intakeId: string, more: Record<string, string> = {}): Promise<void> {
  const { columns, intake } = await readIntake(actor, intakeId);
  const form = new FormData();
  for (const [at, { use }] of columns.entries()) {
    form.set(`meaning-${at}`, use.meaning);
    if (use.unit) form.set(`unit-${at}`, use.unit);
    if (use.catalogue) form.set(`catalogue-${at}`, use.catalogue);
  }
  const sourceId = more.sourceId ?? (await makeSource(actor));
  for (const [name, value] of Object.entries({ epoch: "2015.0", ...more, sourceId })) form.set(name, value);
  await saveMapping(actor, intakeId, intake.version, form);
}

export const dryRun = async (actor: Actor, intakeId: string) => (await readIntake(actor, intakeId)).dryRun;

export const apply = async (actor: Actor, intakeId: string, goodRowsOnly = false) =>
  applyIntake(actor, { intakeId, version: (await readIntake(actor, intakeId)).intake.version, goodRowsOnly });
