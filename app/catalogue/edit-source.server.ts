import { eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { source } from "#app/database/schema/catalogue.ts";
import { NotFound } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { shortCitation } from "./citation.ts";
import { keptAlready, readDuplicate } from "./duplicate-source.server.ts";
import type { EditSource } from "./source-input.ts";

/** A source is read in seals and editions: those under review are looked at again. @throws Conflict, Invalid, NotFound */
export async function editSource(actor: Actor | null, input: z.output<typeof EditSource>): Promise<void> {
  authorise(actor, "source.write");
  const { sourceId, version, ...after } = input;
  await change(actor, "catalogue.edit-source", async (c) => {
    const [found] = await c.tx.select().from(source).where(eq(source.id, sourceId));
    if (!found) throw new NotFound("There is no such source.");
    const names = Object.keys(after) as (keyof typeof after)[];
    const before = Object.fromEntries(names.map((name) => [name, found[name]]));
    if (names.every((name) => found[name] === after[name])) return c.unchanged();
    await compareAndSet(c.tx, source, sourceId, version, after);
    c.audit({ objectType: "source", objectId: sourceId, objectName: shortCitation(after), before, after });
    c.touch({ type: "source", id: sourceId });
  }).catch(async (error: unknown) => {
    throw keptAlready(await readDuplicate(error, after));
  });
}
