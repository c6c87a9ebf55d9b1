import type { Regime } from "#app/astrometry/parallax.ts";
import { type Decimal, decimalOf, floorDecimal, roundToScale, subtractDecimals } from "./decimal.ts";
import { type Language, NO_BREAK } from "./language.ts";
import {
  assumptionNote,
  type FigureForm,
  type FigureMethod,
  type FigureText,
  noted,
  placeOfRange,
  type RangeNumbers,
} from "./range-figure.ts";
import type { RoundingRule } from "./rounding.ts";
import { type CountedYear, countedYear, countedYearText, yearsBetween } from "./year-text.ts";

const whole = (value: Decimal) => roundToScale(value, 0).digits;

/** A moment on the astronomers' year count, to tens or coarser; a year that rounds to nothing is the first of its era. */
function coarseYear(moment: Decimal, place: number): CountedYear {
  const since = floorDecimal(moment) >= 1n;
  const count = whole(roundToScale(since ? moment : subtractDecimals({ digits: 1n, scale: 0 }, moment), place));
  return { count: count < 1n ? 1n : count, era: since ? "since" : "before" };
}

/** The last calendar year that has begun before a moment. */
const yearBefore = (moment: Decimal) => -floorDecimal({ digits: -moment.digits, scale: moment.scale }) - 1n;

const AT: Record<Language, { exact: string; coarse: string }> = {
  en: { exact: "in", coarse: "around" },
  fr: { exact: "en", coarse: "vers" },
};

function years(distanceLy: RangeNumbers, seenInYear: number, place: number) {
  const before = (year: number, travelled: number) => subtractDecimals(decimalOf(year), decimalOf(travelled));
  const first = before(seenInYear, distanceLy.high);
  const middle = before(seenInYear + 0.5, distanceLy.value);
  const end = before(seenInYear + 1, distanceLy.low);
  if (place < 0) return [coarseYear(first, place), coarseYear(middle, place), coarseYear(end, place)] as const;
  const last = yearBefore(end);
  return [countedYear(floorDecimal(first)), countedYear(floorDecimal(middle)), countedYear(last)] as const;
}

/**
 * When the light seen in a calendar year left: "between 2000 and 2002", to be read after "The light left". The range is that
 * of the distance, and wider by the year of seeing itself, so the text holds from its first of January to its last of
 * December. Whole years are calendar years (the first and the last that it can be); coarser places are rounded
 * by roundRange's rule. Julian years are taken for calendar years: a difference of one day in 128 years.
 * Firm: "in 2001", "around 1030", or with its range; wide and prior-led: a range only. `unit` is empty.
 * @param input.seenInYear a whole year on the astronomers' count (0 is 1 BCE)
 * @throws RangeError unless low < value < high, all finite, and a safe whole year; for a prior-led figure from 1/p
 */
export function lightLeftFigure(input: {
  distanceLy: RangeNumbers;
  seenInYear: number;
  regime: Regime;
  method?: FigureMethod;
  form: FigureForm;
  language: Language;
  rule?: RoundingRule;
}): FigureText {
  const { distanceLy, seenInYear, regime, form, language, rule } = input;
  if (!Number.isSafeInteger(seenInYear)) throw new RangeError(`${seenInYear} is not a whole year`);
  const note = assumptionNote(input);
  const place = Math.min(0, placeOfRange(distanceLy, rule));
  const [first, middle, last] = years(distanceLy, seenInYear, place);
  const shown = (year: CountedYear) => countedYearText(year, language);
  const between = yearsBetween(first, last, language);
  const numbers = { low: shown(first), high: shown(last), unit: "", note };
  if (regime !== "firm") return { text: noted(between, note), value: null, ...numbers };
  const value = shown(middle);
  if (form === "range") return { text: noted(between, note), value, ...numbers };
  const at = `${AT[language][place < 0 ? "coarse" : "exact"]}${NO_BREAK}${value}`;
  return { text: noted(form === "value" ? at : `${at} (${between})`, note), value, ...numbers };
}
