import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { newId } from "#app/database/new-id.ts";
import { source } from "#app/database/schema/catalogue.ts";
import { authorise } from "#app/people/authorise.ts";
import { shortCitation } from "./citation.ts";
import { keptAlready, readDuplicate } from "./duplicate-source.server.ts";
import type { CreateSource } from "./source-input.ts";

type NewSource = z.output<typeof CreateSource>;

/** Keeps a publication. The same form sent twice keeps it once. @throws Invalid naming the source that has the code */
export async function createSource(actor: Actor | null, input: NewSource): Promise<string> {
  authorise(actor, "source.write");
  const sourceId = newId();
  try {
    await change(actor, "catalogue.create-source", async (c) => {
      await c.tx.insert(source).values({ id: sourceId, ...input, createdBy: actor.personId });
      c.audit({ objectType: "source", objectId: sourceId, objectName: shortCitation(input), after: input });
    });
    return sourceId;
  } catch (error) {
    const found = await readDuplicate(error, input);
    const names = Object.keys(input) as (keyof NewSource)[];
    const same = names.every((name) => found.kept[name] === input[name]);
    if (same && found.kept.createdBy === actor.personId) return found.kept.id;
    throw keptAlready(found);
  }
}
