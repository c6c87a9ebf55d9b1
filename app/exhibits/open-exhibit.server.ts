import { eq } from "drizzle-orm";
import type { Change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { exhibit, exhibitContributor, scene } from "#app/database/schema/exhibits.ts";
import { NotFound } from "#app/errors.ts";

/** The exhibit, read for changing it. @throws NotFound */
export async function openExhibit(c: Change, exhibitId: string) {
  const [found] = await c.tx.select().from(exhibit).where(eq(exhibit.id, exhibitId));
  if (!found) throw new NotFound("There is no such exhibit.");
  return found;
}

/** A scene and its exhibit, read for changing the scene. @throws NotFound */
export async function openScene(c: Change, sceneId: string) {
  const [found] = await c.tx
    .select()
    .from(scene)
    .innerJoin(exhibit, eq(exhibit.id, scene.exhibitId))
    .where(eq(scene.id, sceneId));
  if (!found) throw new NotFound("There is no such scene.");
  return found;
}

/** Notes that this person's hand is in the exhibit: they may not sign it any more. */
export async function noteContributor(c: Change, exhibitId: string): Promise<void> {
  await c.tx
    .insert(exhibitContributor)
    .values({ exhibitId, personId: c.actor.personId })
    .onDuplicateKeyUpdate({ set: { personId: c.actor.personId } });
}

/**
 * Closes a change of a scene: version compared and counted up, contributor noted, audit row written, seals looked at.
 * @throws Conflict when somebody else saved the scene first.
 */
export async function closeScene(
  c: Change,
  opened: Awaited<ReturnType<typeof openScene>>,
  seenVersion: number,
  set: Partial<typeof scene.$inferInsert>,
  states: { before: unknown; after: unknown },
): Promise<void> {
  await compareAndSet(c.tx, scene, opened.scene.id, seenVersion, set);
  await noteContributor(c, opened.exhibit.id);
  c.audit({
    objectType: "exhibit",
    objectId: opened.exhibit.id,
    objectName: `${opened.exhibit.titleEn} / ${opened.scene.titleEn}`,
    ...states,
  });
  c.touch({ type: "exhibit", id: opened.exhibit.id });
}
