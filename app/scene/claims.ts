import type { Language } from "#app/figures/language.ts";
import { plainNumber } from "#app/figures/office-numbers.ts";
import type { SceneDocument } from "./document.ts";

/** What a scene may say of itself. Computed from the document, never typed. */
export interface SceneClaims {
  positions: "to-scale" | "not-to-scale";
  sizes: "to-scale" | "not-to-scale";
}

/**
 * Positions are to scale exactly when the mapping is linear. Sizes never are: a star drawn as a point of light is larger
 * than its disc would be in any scene that shows more than one.
 */
export function claimsOf(document: Pick<SceneDocument, "mapping">): SceneClaims {
  return { positions: document.mapping === "linear" ? "to-scale" : "not-to-scale", sizes: "not-to-scale" };
}

const SENTENCES: Record<Language, Record<SceneClaims["positions"], string>> = {
  en: {
    "to-scale": "Positions to scale, sizes not.",
    "not-to-scale": "Neither positions nor sizes to scale.",
  },
  fr: {
    "to-scale": "Positions à l’échelle, tailles non.",
    "not-to-scale": "Ni positions ni tailles à l’échelle.",
  },
};

export function claimsSentence(claims: SceneClaims, language: Language): string {
  return SENTENCES[language][claims.positions];
}

const STRETCHED: Record<Language, { rings(times: string): string; noRings: string }> = {
  en: {
    rings: (times) => `Distances stretched: each ring is ${times} times farther`,
    noRings: "Distances stretched: far ones are drawn closer together",
  },
  fr: {
    rings: (times) => `Distances étirées : chaque anneau est ${times} fois plus loin`,
    noRings: "Distances étirées : les plus grandes sont resserrées",
  },
};

/** What stands in place of the scale bar where positions are not to scale. @param ringRatio null without rings */
export function stretchText(ringRatio: number | null, language: Language): string {
  const { rings, noRings } = STRETCHED[language];
  return ringRatio === null ? noRings : rings(plainNumber(ringRatio, language));
}
