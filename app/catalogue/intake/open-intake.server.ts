import { eq } from "drizzle-orm";
import type { Reader } from "#app/database/db.server.ts";
import { intake } from "#app/database/schema/catalogue.ts";
import { NotFound } from "#app/errors.ts";
import { getObject } from "#app/media/object-store.server.ts";
import type { Mapping } from "./mapping.ts";
import { readTable } from "./read-table.ts";

/** An intake and its file, read again as it came. @throws NotFound, Unavailable */
export async function openIntake(reader: Reader, intakeId: string) {
  const [found] = await reader.select().from(intake).where(eq(intake.id, intakeId));
  if (!found) throw new NotFound("There is no such intake.");
  const table = readTable(await getObject(found.storageKey));
  return { intake: found, mapping: found.mapping as Mapping, table };
}
