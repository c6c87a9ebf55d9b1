import type { Language } from "#app/figures/language.ts";
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
    "not-to-scale": "Neither positions nor sizes to scale: distances are drawn together.",
  },
  fr: {
    "to-scale": "Positions à l’échelle, tailles non.",
    "not-to-scale": "Ni positions ni tailles à l’échelle : les distances sont resserrées.",
  },
};

export function claimsSentence(claims: SceneClaims, language: Language): string {
  return SENTENCES[language][claims.positions];
}
