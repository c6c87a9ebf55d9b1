import { createHash } from "node:crypto";
import { and, desc, eq, ne } from "drizzle-orm";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { db, type Reader } from "#app/database/db.server.ts";
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
  const before = await sentBefore(db(), digest);
  if (before) return { intakeId: before, alreadySent: true };
  const table = readTable(upload.bytes);
  const storageKey = `intake/${digest}`;
  await putObject(storageKey, upload.bytes, "application/octet-stream");
  const intakeId = newId();
  const mapping: Mapping = {
    columns: recogniseAll(table.columns),
    options: {
      sourceId: null,
      locator: null,
      epoch: null,
      positionEpoch: null,
      namePrefix: null,
      adopt: false,
      adoptReason: null,
    },
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
  return change(actor, "intake.upload", async (c) => {
    // Of the same form sent twice at once the second one waits here and then finds the first.
    const meanwhile = await sentBefore(c.tx, digest, "hold");
    if (meanwhile) {
      c.unchanged();
      return { intakeId: meanwhile, alreadySent: true };
    }
    await c.tx.insert(intake).values({ ...row, createdBy: actor.personId });
    c.audit({ objectType: "intake", objectId: intakeId, objectName: upload.fileName, after: row });
    return { intakeId, alreadySent: false };
  });
}

/** The intake that this file has already, unless it was given up. */
async function sentBefore(reader: Reader, digest: string, hold?: "hold"): Promise<string | undefined> {
  const asked = reader
    .select({ id: intake.id })
    .from(intake)
    .where(and(eq(intake.digest, digest), ne(intake.state, "abandoned")))
    .orderBy(desc(intake.id))
    .limit(1);
  const [before] = await (hold ? asked.for("update") : asked);
  return before?.id;
}
