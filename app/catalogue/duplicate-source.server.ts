import { eq } from "drizzle-orm";
import { duplicateKey } from "#app/database/database-error.ts";
import { db } from "#app/database/db.server.ts";
import { source } from "#app/database/schema/catalogue.ts";
import { Invalid } from "#app/errors.ts";
import { shortCitation } from "./citation.ts";

interface Identified {
  bibcode: string | null;
  doi: string | null;
}

const FIELDS = { source_bibcode: "bibcode", source_doi: "doi" } as const;

/**
 * The source that stands in the way of another one, and the field by which.
 * @throws the error itself where it is about something else
 */
export async function readDuplicate(error: unknown, input: Identified) {
  const key = duplicateKey(error);
  const field = key === "source_bibcode" || key === "source_doi" ? FIELDS[key] : null;
  const value = field ? input[field] : null;
  if (!field || value === null) throw error;
  const [kept] = await db().select().from(source).where(eq(source[field], value));
  if (!kept) throw error;
  return { field, kept };
}

/** What a person is told who enters a publication again. */
export function keptAlready({ field, kept }: Awaited<ReturnType<typeof readDuplicate>>): Invalid {
  const citation = shortCitation(kept);
  return new Invalid({ [field]: [`This publication is kept already, as ${citation}.`] }, undefined, [
    { to: `/sources/${kept.id}`, label: `Open ${citation}` },
  ]);
}
