import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { duplicateKey } from "#app/database/database-error.ts";
import { newId } from "#app/database/new-id.ts";
import { source } from "#app/database/schema/catalogue.ts";
import { Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { shortCitation } from "./citation.ts";
import type { CreateSource } from "./source-input.ts";

/** @throws the Invalid that belongs to a bibcode or DOI which is kept already, or the error itself */
export function refuseDuplicateSource(error: unknown): never {
  const key = duplicateKey(error);
  if (key === "source_bibcode") throw new Invalid({ bibcode: ["This publication is kept already."] });
  if (key === "source_doi") throw new Invalid({ doi: ["This publication is kept already."] });
  throw error;
}

export async function createSource(actor: Actor | null, input: z.output<typeof CreateSource>): Promise<string> {
  authorise(actor, "source.write");
  const sourceId = newId();
  await change(actor, "catalogue.create-source", async (c) => {
    await c.tx.insert(source).values({ id: sourceId, ...input, createdBy: actor.personId });
    c.audit({ objectType: "source", objectId: sourceId, objectName: shortCitation(input), after: input });
  }).catch(refuseDuplicateSource);
  return sourceId;
}
