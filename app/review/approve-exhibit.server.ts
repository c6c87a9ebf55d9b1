import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { Conflict } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { tellContributors } from "./hand-over.server.ts";
import { readStandingSeals } from "./signers.server.ts";
import type { SignStep } from "./step-input.ts";
import { closeStep, openForStep, refuseBlocked, refuseOwnWork, refuseUnseen } from "./take-step.server.ts";

/**
 * A publisher approves what the scientist verified, to the byte.
 * @throws Forbidden when it is their own work, Conflict when the verified digest is not today's.
 */
export async function approveExhibit(actor: Actor | null, input: z.output<typeof SignStep>): Promise<void> {
  authorise(actor, "review.approve");
  await change(actor, "review.approve", async (c) => {
    const opened = await openForStep(c, "approve", input.exhibitId);
    await refuseOwnWork(c, actor, input.exhibitId);
    refuseUnseen(opened, input.digest);
    refuseBlocked(opened.content);
    const verified = (await readStandingSeals(c.tx, input.exhibitId)).find((one) => one.kind === "verified");
    if (verified?.digest !== opened.sealed.digest) {
      throw new Conflict("What the scientist verified is not what stands here now. It has to be verified again.");
    }
    await closeStep(c, "approve", opened, input);
    const about = { exhibitId: opened.exhibit.id, title: opened.exhibit.titleEn };
    await tellContributors(c, about, `Approved: ${about.title}`, [
      `${actor.name} has approved “${about.title}”. It can be published now.`,
      ...(input.note ? [`They write: ${input.note}`] : []),
    ]);
  });
}
