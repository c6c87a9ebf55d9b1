import type { ExhibitState, SealKind } from "#app/database/enums.ts";
import type { Permission } from "#app/people/permissions.ts";

/** What can be done with an exhibit, from which states, by whom, and where it leads. Data: tests walk all of it. */
export const STEPS = {
  submit: { from: ["draft"], to: "submitted", permission: "exhibit.submit", seal: "submitted" },
  verify: { from: ["submitted"], to: "verified", permission: "review.verify", seal: "verified" },
  approve: { from: ["verified"], to: "approved", permission: "review.approve", seal: "approved" },
  "send-back": { from: ["submitted", "verified"], to: "draft", permission: "review.send-back", seal: null },
  "take-back": { from: ["submitted", "verified", "approved"], to: "draft", permission: "exhibit.submit", seal: null },
} as const satisfies Record<
  string,
  { from: readonly ExhibitState[]; to: ExhibitState; permission: Permission; seal: SealKind | null }
>;

export type Step = keyof typeof STEPS;

export function stepsFrom(state: ExhibitState): Step[] {
  return (Object.keys(STEPS) as Step[]).filter((step) => (STEPS[step].from as readonly ExhibitState[]).includes(state));
}

/** Whose turn it is, for the desk and for the mail at a hand-over. */
export const TURN: Record<ExhibitState, "editor" | "scientist" | "publisher"> = {
  draft: "editor",
  submitted: "scientist",
  verified: "publisher",
  approved: "publisher",
};
