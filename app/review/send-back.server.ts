import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { Forbidden } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { mayDo } from "#app/people/permissions.ts";
import { tellContributors } from "./hand-over.server.ts";
import type { ReturnStep } from "./step-input.ts";
import { closeStep, openForStep } from "./take-step.server.ts";
import { voidStandingSeals } from "./void-seals.server.ts";

/** The reviewer whose turn it is returns an exhibit to its editors, saying why. */
export async function sendBack(actor: Actor | null, input: z.output<typeof ReturnStep>): Promise<void> {
  authorise(actor, "review.send-back");
  await change(actor, "review.send-back", async (c) => {
    const opened = await openForStep(c, "send-back", input.exhibitId);
    const turn = opened.exhibit.state === "submitted" ? "review.verify" : "review.approve";
    if (!mayDo(actor.roles, turn)) throw new Forbidden("It is not your turn with this exhibit.");
    await closeStep(c, "send-back", opened, { ...input, digest: opened.sealed.digest });
    const reason = { why: "returned", by: actor.name, note: input.note, moved: [] } as const;
    await voidStandingSeals(c, opened.exhibit.id, { ...reason, moved: [] });
    const about = { exhibitId: opened.exhibit.id, title: opened.exhibit.titleEn };
    await tellContributors(c, about, `Sent back: ${about.title}`, [
      `${actor.name} has sent “${about.title}” back.`,
      `They write: ${input.note}`,
    ]);
  });
}
