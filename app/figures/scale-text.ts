import { decimalOf, formatDecimal } from "./decimal.ts";
import { type Language, NO_BREAK, shownDigits } from "./language.ts";
import { unitWord, type WordedUnit } from "./unit-words.ts";

/** A length chosen to be round (a ring, a scale bar), exact as it stands: "20 light-years". @throws RangeError */
export function scaleText(length: number, unit: WordedUnit, language: Language): string {
  const plain = formatDecimal(decimalOf(length));
  return `${shownDigits(plain, language)}${NO_BREAK}${unitWord(plain, unit, language)}`;
}

/** The same with the unit's symbol: "20 ly" (French: "20 al"). */
export function scaleSymbolText(length: number, unit: WordedUnit, language: Language): string {
  const symbol = language === "fr" && unit === "ly" ? "al" : unit === "yr" && language === "fr" ? "ans" : unit;
  return `${shownDigits(formatDecimal(decimalOf(length)), language)}${NO_BREAK}${symbol}`;
}
