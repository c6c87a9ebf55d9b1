import { createHash } from "node:crypto";
import { desc, eq } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { db } from "#app/database/db.server.ts";
import { newId } from "#app/database/new-id.ts";
import { intake } from "#app/database/schema/catalogue.ts";
import { putObject } from "#app/media/object-store.server.ts";
import { authorise } from "#app/people/authorise.ts";
import type { Mapping } from "./mapping.ts";
import { recogniseAll } from "./meanings.ts";
import { readTable } from "./read-table.ts";

/**
 * Takes a file in: read, its columns recognised, kept as it came. Nothing of it is in the catalogue yet.
 * @returns the intake; an earlier one when the same file was sent before
 * @throws Invalid at `file`, Unavailable
 */
export async function uploadTable(
  actor: Actor | null,
  upload: { fileName: string; bytes: Uint8Array },
): Promise<{ intakeId: string; alreadySent: boolean }> {
  authorise(actor, "intake.write");
  const digest = createHash("sha256").update(upload.bytes).digest("hex");
  const [before] = await db()
    .select({ id: intake.id, state: intake.state })
    .from(intake)
    .where(eq(intake.digest, digest))
    .orderBy(desc(intake.id))
    .limit(1);
  if (before && before.state !== "abandoned") return { intakeId: before.id, alreadySent: true };
  const table = readTable(upload.bytes);
  const storageKey = `intake/${digest}`;
  await putObject(storageKey, upload.bytes, "application/octet-stream");
  const intakeId = newId();
  const mapping: Mapping = {
    columns: recogniseAll(table.columns),
    options: { sourceId: null, locator: null, epoch: null, namePrefix: null, adopt: false, adoptReason: null },
  };
  const row = {
    id: intakeId,
    fileName: upload.fileName,
    digest,
    bytes: upload.bytes.byteLength,
    format: table.format,
    storageKey,
    mapping,
    rowCount: table.rows.length,
  };
  await change(actor, "intake.upload", async (c) => {
    await c.tx.insert(intake).values({ ...row, createdBy: actor.personId });
    c.audit({ objectType: "intake", objectId: intakeId, objectName: upload.fileName, after: row });
  });
  return { intakeId, alreadySent: false };
}
