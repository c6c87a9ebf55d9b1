import { decimalOf, formatDecimal, parseDecimal, roundToScale, timesTenTo, toSignificant } from "./decimal.ts";
import { type Language, NO_BREAK, shownDigits } from "./language.ts";

/**
 * A number for an office page, with every digit that it has; rounded (half away from zero) when `decimals` is given.
 * @param value decimal text, or a double (its shortest decimal text is meant)
 * @param decimals digits after the decimal mark; negative ones round to tens, hundreds...
 * @throws RangeError when it is not a finite number
 */
export function plainNumber(value: number | string, language: Language, decimals?: number): string {
  const decimal = typeof value === "string" ? parseDecimal(value) : decimalOf(value);
  return shownDigits(formatDecimal(decimals === undefined ? decimal : roundToScale(decimal, decimals)), language);
}

/**
 * A number to so many significant digits, without an exponent: axes, tooltips, readouts. Zero is "0".
 * @param digits at least 1
 * @throws RangeError when it is not finite
 */
export function significantNumber(value: number, digits: number, language: Language): string {
  return shownDigits(formatDecimal(toSignificant(decimalOf(value), digits)), language);
}

/** "0.28 %": a fraction as percent, two significant digits under ten percent and three from there. @throws RangeError */
export function percentText(fraction: number, language: Language): string {
  const percent = timesTenTo(decimalOf(fraction), 2);
  const digits = Math.abs(fraction) < 0.1 ? 2 : 3;
  return `${shownDigits(formatDecimal(toSignificant(percent, digits)), language)}${NO_BREAK}%`;
}

/**
 * "130.23 ± 0.36 mas": a measurement with the digits its source printed.
 * @param value decimal text
 * @param error decimal text, or null where the source gives none
 * @throws RangeError for what is no decimal number
 */
export function measurementText(measurement: {
  value: string;
  error: string | null;
  unit: string;
  language: Language;
}): string {
  const { value, error, unit, language } = measurement;
  const shown = (text: string) => shownDigits(formatDecimal(parseDecimal(text)), language);
  const spread = error === null ? "" : `${NO_BREAK}\u00b1${NO_BREAK}${shown(error)}`;
  return `${shown(value)}${spread}${NO_BREAK}${unit}`;
}

/** "31.01°". @throws RangeError when it is not finite */
export function degreesText(degrees: number, language: Language, decimals = 2): string {
  return `${plainNumber(degrees, language, decimals)}°`;
}

/**
 * "J1991.25": a Julian epoch as catalogues name it, the same in every language.
 * @param epoch decimal text of the Julian year, digits kept
 * @throws RangeError for what is no decimal number
 */
export function epochText(epoch: string): string {
  return `J${formatDecimal(parseDecimal(epoch))}`;
}
