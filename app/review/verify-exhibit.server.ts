import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { tellContributors, tellRole } from "./hand-over.server.ts";
import type { SignStep } from "./step-input.ts";
import { closeStep, openForStep, refuseBlocked, refuseOwnWork, refuseUnseen } from "./take-step.server.ts";

/**
 * A scientist seals the exact content they saw.
 * @throws Forbidden when it is their own work, Conflict when it changed since they saw it, Invalid when it is blocked.
 */
export async function verifyExhibit(actor: Actor | null, input: z.output<typeof SignStep>): Promise<void> {
  authorise(actor, "review.verify");
  await change(actor, "review.verify", async (c) => {
    const opened = await openForStep(c, "verify", input.exhibitId);
    await refuseOwnWork(c, actor, input.exhibitId);
    refuseUnseen(opened, input.digest);
    refuseBlocked(opened.content);
    await closeStep(c, "verify", opened, input);
    const about = { exhibitId: opened.exhibit.id, title: opened.exhibit.titleEn };
    const lines = [
      `${actor.name} has verified every number in “${about.title}”.`,
      ...(input.note ? [`They write: ${input.note}`] : []),
    ];
    await tellRole(c, "publisher", about, `To approve: ${about.title}`, lines);
    await tellContributors(c, about, `Verified: ${about.title}`, lines);
  });
}
