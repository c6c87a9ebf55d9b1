import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { authorise } from "#app/people/authorise.ts";
import type { TakeBackStep } from "./step-input.ts";
import { closeStep, openForStep } from "./take-step.server.ts";
import { voidStandingSeals } from "./void-seals.server.ts";

/** An editor takes an exhibit out of review to work on it again. Its seals end; its editions stay as they are. */
export async function takeBack(actor: Actor | null, input: z.output<typeof TakeBackStep>): Promise<void> {
  authorise(actor, "exhibit.submit");
  await change(actor, "review.take-back", async (c) => {
    const opened = await openForStep(c, "take-back", input.exhibitId);
    await closeStep(c, "take-back", opened, { ...input, digest: opened.sealed.digest });
    const reason = { why: "returned" as const, by: actor.name, note: input.note, moved: [] };
    await voidStandingSeals(c, opened.exhibit.id, reason);
  });
}
