import type { ExhibitState } from "#app/database/enums.ts";
import type { StateTone } from "#app/ui/StateMark.tsx";

export const EXHIBIT_STATE: Record<ExhibitState, { word: string; tone: StateTone }> = {
  draft: { word: "draft", tone: "none" },
  submitted: { word: "waits for the scientist", tone: "person" },
  verified: { word: "verified, waits for the publisher", tone: "sealed" },
  approved: { word: "approved", tone: "sealed" },
};
