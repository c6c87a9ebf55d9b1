import { type DistanceAnswer, distanceFromParallax } from "#app/astrometry/distance.ts";
import type { Prior } from "#app/astrometry/posterior.ts";
import type { Language } from "#app/figures/language.ts";
import { percentText, significantNumber } from "#app/figures/office-numbers.ts";
import { distanceFigure } from "#app/figures/range-figure.ts";
import type { DistanceQuestion } from "./distance-query.ts";

/**
 * The answer of GET /api/distance, every number at full precision. What is infinite is null in JSON: that is
 * `fractionalError` for a parallax of zero, and nothing else.
 */
export interface DistanceReply extends Omit<DistanceAnswer, "fractionalError"> {
  fractionalError: number | null;
  /** The prior that was used, with its length or limit; says when the length is the default. */
  prior: (Prior & { lengthIsDefault?: boolean }) | null;
  /** What a visitor may read, in light-years; null where there is no distance, or no range that digits can show. */
  text: Record<Language, string> | null;
  /** What a person has to know before using it: two peaks, or a range too narrow to show. */
  warning: string | null;
}

function textOf(answer: DistanceAnswer): Record<Language, string> | null {
  const { ly, method, regime } = answer;
  if (!ly || !method || !(ly.low < ly.value && ly.value < ly.high)) return null;
  const say = (language: Language) =>
    distanceFigure({ distance: ly, regime, method, unit: "ly", form: "value-and-range", language }).text;
  return { en: say("en"), fr: say("fr") };
}

const SMALLEST_SHARE = 0.001;
const shareText = (share: number) =>
  share < SMALLEST_SHARE ? `less than ${percentText(SMALLEST_SHARE, "en")}` : percentText(share, "en");

function peaksWarning({ modes, modeShares }: DistanceAnswer): string {
  const peaks = modes.map((pc, i) => `${significantNumber(pc, 4, "en")} pc (${shareText(modeShares[i] ?? 0)})`);
  return `The posterior has two peaks, at ${peaks.join(" and ")}: one value and one range do not describe it well.`;
}

function warningOf(answer: DistanceAnswer, text: DistanceReply["text"]): string | null {
  if (answer.modes.length > 1) return peaksWarning(answer);
  if (answer.pc && !text) return "The range is narrower than the digits of the distance can show, so there is no text.";
  return null;
}

/** What follows from a parallax and its error, under the prior that was asked for: numbers, words, and what to beware of. */
export function answerDistance({ lengthIsDefault, ...question }: DistanceQuestion): DistanceReply {
  const answer = distanceFromParallax(question);
  const text = textOf(answer);
  const { prior } = question;
  return {
    ...answer,
    fractionalError: Number.isFinite(answer.fractionalError) ? answer.fractionalError : null,
    prior: prior?.name === "edsd" ? { ...prior, lengthIsDefault } : prior,
    text,
    warning: warningOf(answer, text),
  };
}
