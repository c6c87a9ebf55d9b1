import type { DistanceAnswer } from "#app/astrometry/distance.ts";
import { convertLength } from "#app/astrometry/units.ts";
import type { FigureForm, FigureQuantity, FigureUnit } from "#app/database/enums.ts";
import { type FigureText, lightTravelFigure, rangeFigure } from "#app/figures/range-figure.ts";

/** The same, or null with the reason where the digits of a distance cannot show its range. */
export function figureWordsOrReason(
  answer: DistanceAnswer,
  of: Parameters<typeof figureWords>[1],
): { en: FigureText; fr: FigureText; reason: null } | { en: null; fr: null; reason: string } {
  try {
    return { en: figureWords(answer, of, "en"), fr: figureWords(answer, of, "fr"), reason: null };
  } catch (problem) {
    if (!(problem instanceof RangeError)) throw problem;
    return { en: null, fr: null, reason: problem.message };
  }
}

/** A record's number in words, by the one service that rounds. @throws RangeError where no range can be shown */
export function figureWords(
  answer: DistanceAnswer,
  of: { quantity: FigureQuantity; unit: FigureUnit; form: FigureForm },
  language: "en" | "fr",
): FigureText {
  if (!answer.pc) throw new RangeError(answer.reason ?? "there is no distance");
  const unit = of.quantity === "light-travel" ? "ly" : of.unit;
  const to = (pc: number) => convertLength(pc, "pc", unit);
  const range = { value: to(answer.pc.value), low: to(answer.pc.low), high: to(answer.pc.high) };
  const { form } = of;
  const { regime } = answer;
  const method = answer.method ?? undefined;
  if (of.quantity === "light-travel") return lightTravelFigure({ distanceLy: range, regime, method, form, language });
  return rangeFigure({ range, regime, method, unit: of.unit, form, language });
}
