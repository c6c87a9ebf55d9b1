import type { Regime } from "#app/astrometry/parallax.ts";
import type { Prior } from "#app/astrometry/posterior.ts";
import { compareDecimals, decimalOf, formatDecimal, roundToScale, subtractDecimals } from "./decimal.ts";
import { type Language, NO_BREAK, shownDigits } from "./language.ts";
import { placeOfUncertainty, type RoundingRule } from "./rounding.ts";
import { unitWord, type WordedUnit } from "./unit-words.ts";

/** A number with its 68 % range, low <= value <= high, all in one unit. */
export interface RangeNumbers {
  value: number;
  low: number;
  high: number;
}

/** How the numbers were come by: one over the parallax, or the posterior under a named prior. */
export type FigureMethod = "inverse" | Prior["name"];

export type FigureForm = "value" | "range" | "value-and-range";

export interface FigureText {
  /** What a visitor reads. */
  text: string;
  /** The shown digits in the language; null where the regime allows a range only. */
  value: string | null;
  low: string;
  high: string;
  /** The unit's word as it stands in the text. */
  unit: string;
  /** "depends on the assumption", where it does. */
  note: string | null;
}

/**
 * The one place for a value and its range, as a scale (2: hundredths, -1: tens): see roundRange.
 * @throws RangeError unless low < value < high, all finite
 */
export function placeOfRange({ value, low, high }: RangeNumbers, rule: RoundingRule = "pdg"): number {
  const [middle, from, to] = [decimalOf(value), decimalOf(low), decimalOf(high)];
  const below = subtractDecimals(middle, from);
  const above = subtractDecimals(to, middle);
  if (below.digits <= 0n || above.digits <= 0n) throw new RangeError("a range needs low < value < high");
  return placeOfUncertainty(compareDecimals(below, above) < 0 ? below : above, rule);
}

/**
 * Value and range to one place: the one that the rule gives for the smaller of the two half-widths, so that the finer
 * side of a lopsided range is not blurred. All three are rounded half away from zero, so the shown range contains the
 * shown value and never closes up.
 * @returns plain decimal texts
 * @throws RangeError unless low < value < high, all finite
 */
export function roundRange(
  range: RangeNumbers,
  rule: RoundingRule = "pdg",
): { value: string; low: string; high: string } {
  const place = placeOfRange(range, rule);
  const show = (number: number) => formatDecimal(roundToScale(decimalOf(number), place));
  return { value: show(range.value), low: show(range.low), high: show(range.high) };
}

export const BETWEEN: Record<Language, (low: string, high: string) => string> = {
  en: (low, high) => `between ${low} and ${high}`,
  fr: (low, high) => `entre ${low} et ${high}`,
};

const DEPENDS: Record<Language, string> = {
  en: "depends on the assumption",
  fr: "dépend de l’hypothèse",
};

interface Said {
  regime: Regime;
  method?: FigureMethod;
  language: Language;
}

/**
 * "depends on the assumption" for whatever a prior had a hand in; null for 1/p.
 * @throws RangeError for a prior-led figure from 1/p: of that nothing may be said
 */
export function assumptionNote({ regime, method, language }: Said): string | null {
  if (regime === "prior-led" && method === "inverse") {
    throw new RangeError("nothing may be said from 1/p where only a prior can lead");
  }
  const assumed = regime === "prior-led" || (method !== undefined && method !== "inverse");
  return assumed ? DEPENDS[language] : null;
}

/** The text with its note, if it has one. */
export const noted = (text: string, note: string | null) => (note ? `${text} (${note})` : text);

interface RangeFigure extends Said {
  range: RangeNumbers;
  unit: WordedUnit;
  form: FigureForm;
  rule?: RoundingRule;
}

/**
 * A number with its range in words, as much as the regime allows: firm, as asked; wide and prior-led, a range in
 * numbers only. What a prior had a hand in is marked as depending on the assumption. Large and small numbers stay
 * digits in the one unit ("1,630,000 light-years"): never powers, never "million", so that two figures can be compared.
 * @throws RangeError unless low < value < high, all finite; for a prior-led figure from 1/p
 */
export function rangeFigure({ range, unit, form, rule, ...said }: RangeFigure): FigureText {
  const note = assumptionNote(said);
  const { regime, language } = said;
  const plain = roundRange(range, rule);
  const shown = (text: string) => shownDigits(text, language);
  const [value, low, high] = [shown(plain.value), shown(plain.low), shown(plain.high)];
  const between = BETWEEN[language](low, high);
  if (regime !== "firm" || form === "range") {
    const word = unitWord(plain.high, unit, language);
    const text = noted(`${between}${NO_BREAK}${word}`, note);
    return { text, value: regime === "firm" ? value : null, low, high, unit: word, note };
  }
  const word = unitWord(plain.value, unit, language);
  const text = noted(`${value}${NO_BREAK}${word}${form === "value" ? "" : ` (${between})`}`, note);
  return { text, value, low, high, unit: word, note };
}

/**
 * A distance in words: "103.9 light-years (between 103.1 and 104.7)". `distance` is in `unit`; `rule` is "pdg" unless told.
 * @throws RangeError unless low < value < high, all finite; for a prior-led distance from 1/p
 */
export function distanceFigure(input: {
  distance: RangeNumbers;
  regime: Regime;
  method?: FigureMethod;
  unit: "ly" | "pc" | "au" | "km";
  form: FigureForm;
  language: Language;
  rule?: RoundingRule;
}): FigureText {
  const { distance: range, ...rest } = input;
  return rangeFigure({ range, ...rest });
}

/**
 * How long light was on its way, in Julian years: the number of the distance in light-years, with years for its unit.
 * @throws RangeError as distanceFigure does
 */
export function lightTravelFigure(input: {
  distanceLy: RangeNumbers;
  regime: Regime;
  method?: FigureMethod;
  form: FigureForm;
  language: Language;
  rule?: RoundingRule;
}): FigureText {
  const { distanceLy: range, ...rest } = input;
  return rangeFigure({ range, unit: "yr", ...rest });
}
