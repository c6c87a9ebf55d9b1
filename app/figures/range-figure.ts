import type { Regime } from "#app/astrometry/parallax.ts";
import { compareDecimals, type Decimal, decimalOf, formatDecimal, roundToScale, subtractDecimals } from "./decimal.ts";
import { type Language, NO_BREAK, shownDigits } from "./language.ts";
import { placeOfUncertainty, type RoundingRule } from "./rounding.ts";
import { unitWord, type WordedUnit } from "./unit-words.ts";

/** A number with its 68 % range, low <= value <= high, all in one unit. */
export interface RangeNumbers {
  value: number;
  low: number;
  high: number;
}

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
 * Value and range to one place: the one that the rule gives for the smaller of the two half-widths, so that the finer
 * side of a lopsided range is not blurred. All three are rounded half away from zero, so the shown range contains the
 * shown value and never closes up.
 * @returns plain decimal texts
 * @throws RangeError unless low < value < high, all finite
 */
export function roundRange(
  { value, low, high }: RangeNumbers,
  rule: RoundingRule = "pdg",
): { value: string; low: string; high: string } {
  const [middle, from, to] = [decimalOf(value), decimalOf(low), decimalOf(high)];
  const below = subtractDecimals(middle, from);
  const above = subtractDecimals(to, middle);
  if (below.digits <= 0n || above.digits <= 0n) throw new RangeError("a range needs low < value < high");
  const place = placeOfUncertainty(compareDecimals(below, above) < 0 ? below : above, rule);
  const show = (decimal: Decimal) => formatDecimal(roundToScale(decimal, place));
  return { value: show(middle), low: show(from), high: show(to) };
}

const BETWEEN: Record<Language, (low: string, high: string) => string> = {
  en: (low, high) => `between ${low} and ${high}`,
  fr: (low, high) => `entre ${low} et ${high}`,
};

const DEPENDS: Record<Language, string> = {
  en: "depends on the assumption",
  fr: "dépend de l’hypothèse",
};

interface RangeFigure {
  range: RangeNumbers;
  regime: Regime;
  unit: WordedUnit;
  form: FigureForm;
  language: Language;
}

/**
 * A number with its range in words, as much as the regime allows: firm, as asked; wide, a range in numbers only;
 * prior-led, a range marked as depending on the assumption.
 * @throws RangeError unless low < value < high, all finite
 */
export function rangeFigure({ range, regime, unit, form, language }: RangeFigure): FigureText {
  const plain = roundRange(range);
  const shown = (text: string) => shownDigits(text, language);
  const [value, low, high] = [shown(plain.value), shown(plain.low), shown(plain.high)];
  const between = BETWEEN[language](low, high);
  const note = regime === "prior-led" ? DEPENDS[language] : null;
  if (regime !== "firm" || form === "range") {
    const word = unitWord(plain.high, unit, language);
    const text = `${between}${NO_BREAK}${word}${note ? ` (${note})` : ""}`;
    return { text, value: regime === "firm" ? value : null, low, high, unit: word, note };
  }
  const word = unitWord(plain.value, unit, language);
  const text = `${value}${NO_BREAK}${word}${form === "value" ? "" : ` (${between})`}`;
  return { text, value, low, high, unit: word, note };
}

/** A distance in words. `distance` is in `unit`. @throws RangeError unless low < value < high, all finite */
export function distanceFigure(input: {
  distance: RangeNumbers;
  regime: Regime;
  unit: "ly" | "pc" | "au" | "km";
  form: FigureForm;
  language: Language;
}): FigureText {
  const { distance: range, ...rest } = input;
  return rangeFigure({ range, ...rest });
}

/** How long light was on its way, in Julian years: the number of the distance in light-years, with years for its unit. */
export function lightTravelFigure(input: {
  distanceLy: RangeNumbers;
  regime: Regime;
  form: FigureForm;
  language: Language;
}): FigureText {
  const { distanceLy: range, ...rest } = input;
  return rangeFigure({ range, unit: "yr", ...rest });
}
