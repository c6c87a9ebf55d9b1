import type { Language } from "#app/figures/language.ts";

/** What the stage itself says: buttons, hints, the caption under the scale bar. */
export interface StageWords {
  turnLeft: string;
  turnRight: string;
  nearer: string;
  farther: string;
  startAgain: string;
  /** Named for the keyboard and for screen readers. */
  stage: string;
  gestures: string;
  keys: string;
  nothingChosen: string;
  /** The bar is true at one distance from the eye only. */
  whereSunStands(length: string): string;
  chosen(name: string, distance: string): string;
  table: { caption: string; name: string; distance: string; longitude: string; latitude: string; kind: string };
  regimes: Record<"firm" | "wide" | "prior-led", string>;
}

export const STAGE_WORDS: Record<Language, StageWords> = {
  en: {
    turnLeft: "Turn left",
    turnRight: "Turn right",
    nearer: "Nearer",
    farther: "Farther",
    startAgain: "Start again",
    stage: "The stars in space",
    gestures: "Drag to turn, pinch or use the wheel to go nearer, touch a star to choose it.",
    keys: "Arrow keys turn, plus and minus go nearer and farther, N and P go through the stars, Enter chooses the one in the middle, Escape none, Home or 0 starts again.",
    nothingChosen: "No star chosen",
    whereSunStands: (length) => `${length} where the Sun stands`,
    chosen: (name, distance) => `${name}, ${distance}`,
    table: {
      caption: "Who is where",
      name: "Star",
      distance: "Distance",
      longitude: "Galactic longitude",
      latitude: "Galactic latitude",
      kind: "Distance known",
    },
    regimes: { firm: "firmly", wide: "within a wide range", "prior-led": "mostly from an assumption" },
  },
  fr: {
    turnLeft: "Tourner à gauche",
    turnRight: "Tourner à droite",
    nearer: "Plus près",
    farther: "Plus loin",
    startAgain: "Recommencer",
    stage: "Les étoiles dans l’espace",
    gestures:
      "Faites glisser pour tourner, pincez ou utilisez la molette pour approcher, touchez une étoile pour la choisir.",
    keys: "Les flèches tournent, plus et moins rapprochent et éloignent, N et P passent d’une étoile à l’autre, Entrée choisit celle du milieu, Échap aucune, Origine ou 0 recommence.",
    nothingChosen: "Aucune étoile choisie",
    whereSunStands: (length) => `${length} là où se trouve le Soleil`,
    chosen: (name, distance) => `${name}, ${distance}`,
    table: {
      caption: "Qui est où",
      name: "Étoile",
      distance: "Distance",
      longitude: "Longitude galactique",
      latitude: "Latitude galactique",
      kind: "Distance connue",
    },
    regimes: { firm: "fermement", wide: "dans un large intervalle", "prior-led": "surtout par hypothèse" },
  },
};
