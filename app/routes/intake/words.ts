import { MEANINGS, type Meaning, quantityOf } from "#app/catalogue/intake/meanings.ts";
import { QUANTITY_FACTS } from "#app/catalogue/quantities.ts";
import type { IntakeState } from "#app/database/enums.ts";
import type { StateTone } from "#app/ui/StateMark.tsx";

const PLAIN: Partial<Record<Meaning, string>> = {
  ignore: "not taken",
  name: "name",
  identifier: "identifier",
  ra: "right ascension",
  dec: "declination",
};

function words(meaning: Meaning): string {
  const quantity = quantityOf(meaning);
  if (!quantity) return PLAIN[meaning] ?? meaning;
  const { label } = QUANTITY_FACTS[quantity];
  // "Magnitude V" is "magnitude V", not "magnitude v".
  const inSentence = label.charAt(0).toLowerCase() + label.slice(1);
  return meaning.endsWith("-error") ? `error of ${inSentence}` : inSentence;
}

export const MEANING_OPTIONS = MEANINGS.map((meaning) => ({ value: meaning, label: words(meaning) }));

export const INTAKE_STATE: Record<IntakeState, { word: string; tone: StateTone }> = {
  uploaded: { word: "waits for you", tone: "person" },
  applied: { word: "in the catalogue", tone: "none" },
  abandoned: { word: "given up", tone: "none" },
};
