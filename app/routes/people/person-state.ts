import type { PersonState } from "#app/database/enums.ts";
import type { StateTone } from "#app/ui/StateMark.tsx";

export const PERSON_STATE: Record<PersonState, { word: string; tone: StateTone }> = {
  invited: { word: "invited", tone: "person" },
  active: { word: "active", tone: "live" },
  deactivated: { word: "closed", tone: "none" },
};
