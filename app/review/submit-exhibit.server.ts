import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { tellRole } from "./hand-over.server.ts";
import type { SignStep } from "./step-input.ts";
import { closeStep, openForStep, refuseBlocked, refuseUnseen } from "./take-step.server.ts";

/**
 * An editor sends an exhibit to the scientist.
 * @throws Invalid with everything that blocks, Conflict when it changed since it was seen.
 */
export async function submitExhibit(actor: Actor | null, input: z.output<typeof SignStep>): Promise<void> {
  authorise(actor, "exhibit.submit");
  await change(actor, "review.submit", async (c) => {
    const opened = await openForStep(c, "submit", input.exhibitId);
    refuseUnseen(opened, input.digest);
    refuseBlocked(opened.content);
    await closeStep(c, "submit", opened, input);
    const about = { exhibitId: opened.exhibit.id, title: opened.exhibit.titleEn };
    await tellRole(c, "scientist", about, `To verify: ${about.title}`, [
      `${actor.name} has submitted “${about.title}”. Every number in it waits for a scientist's eyes.`,
      ...(input.note ? [`They write: ${input.note}`] : []),
    ]);
  });
}
