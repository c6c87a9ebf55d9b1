import type { Actor } from "#app/audit/actor.ts";
import type { Change } from "#app/audit/change.server.ts";
import { compareAndSet } from "#app/database/compare-and-set.server.ts";
import { exhibit } from "#app/database/schema/exhibits.ts";
import { seal } from "#app/database/schema/review.ts";
import { Conflict, Forbidden, Invalid } from "#app/errors.ts";
import { checkContent } from "#app/exhibits/checks.ts";
import type { ExhibitContent } from "#app/exhibits/content.ts";
import { openExhibit } from "#app/exhibits/open-exhibit.server.ts";
import { resolveExhibit } from "#app/exhibits/resolve-exhibit.server.ts";
import { type Sealable, sealable } from "./digest.server.ts";
import { readContributors, readStandingSeals } from "./signers.server.ts";
import { STEPS, type Step } from "./workflow.ts";

export interface StepInput {
  exhibitId: string;
  version: number;
  /** The digest of what the person had on the screen: they sign that and nothing else. */
  digest: string;
  note: string | null;
}

export interface Opened {
  exhibit: Awaited<ReturnType<typeof openExhibit>>;
  content: ExhibitContent;
  sealed: Sealable;
}

/** @throws Conflict when the step does not lead from the exhibit's state. */
export async function openForStep(c: Change, step: Step, exhibitId: string): Promise<Opened> {
  const found = await openExhibit(c, exhibitId);
  if (!(STEPS[step].from as readonly string[]).includes(found.state)) {
    throw new Conflict(`The exhibit is ${found.state} now, so this step does not apply any more.`);
  }
  const content = await resolveExhibit(c.tx, exhibitId);
  return { exhibit: found, content, sealed: sealable(content) };
}

/**
 * Nobody signs their own work: not a contributor, and not somebody who has signed this round already.
 * @throws Forbidden with the reason
 */
export async function refuseOwnWork(c: Change, actor: Actor, exhibitId: string): Promise<void> {
  const contributors = await readContributors(c.tx, exhibitId);
  if (contributors.some((one) => one.personId === actor.personId)) {
    throw new Forbidden("You have worked on this exhibit yourself, so somebody else has to sign it.");
  }
  const signed = (await readStandingSeals(c.tx, exhibitId)).find((one) => one.personId === actor.personId);
  if (signed) {
    throw new Forbidden(`You have ${signed.kind} this exhibit yourself, so somebody else has to take the next step.`);
  }
}

/** @throws Conflict when the content is not what the person saw. */
export function refuseUnseen(opened: Opened, digest: string): void {
  if (opened.sealed.digest === digest) return;
  throw new Conflict("The content changed after you opened this page. Look at it again before you sign.");
}

/** @throws Invalid with everything that blocks. */
export function refuseBlocked(content: ExhibitContent): void {
  const blocking = checkContent(content).filter((check) => check.level === "blocks");
  if (blocking.length === 0) return;
  const place = (sceneId: string | null) => {
    const at = content.scenes.findIndex((scene) => scene.id === sceneId);
    return at < 0 ? "" : `Scene ${at + 1}: `;
  };
  throw new Invalid({ "": blocking.map((check) => place(check.sceneId) + check.message) });
}

/** Writes the seal (where the step has one), the new state and the audit row. */
export async function closeStep(c: Change, step: Step, opened: Opened, input: StepInput): Promise<string | null> {
  const { to, seal: kind } = STEPS[step];
  await compareAndSet(c.tx, exhibit, opened.exhibit.id, input.version, { state: to });
  if (kind) {
    await c.tx.insert(seal).values({
      exhibitId: opened.exhibit.id,
      kind,
      digest: opened.sealed.digest,
      content: opened.sealed.content,
      personId: c.actor.personId,
      signedAt: new Date(),
      note: input.note,
    });
  }
  c.audit({
    objectType: "exhibit",
    objectId: opened.exhibit.id,
    objectName: opened.exhibit.titleEn,
    before: { state: opened.exhibit.state },
    after: { state: to, ...(kind ? { digest: opened.sealed.digest } : {}) },
    note: input.note ?? undefined,
  });
  return kind;
}
