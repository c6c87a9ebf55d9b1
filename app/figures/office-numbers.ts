import { type Decimal, decimalOf, formatDecimal, parseDecimal, roundToScale } from "./decimal.ts";
import { type Language, NO_BREAK, shownDigits } from "./language.ts";

/**
 * A number for an office page. Text keeps its digits; a double is rounded to `decimals` (0 unless told).
 * @throws RangeError when it is not a finite number
 */
export function plainNumber(value: number | string, language: Language, decimals?: number): string {
  const decimal = typeof value === "string" ? parseDecimal(value) : roundToScale(decimalOf(value), decimals ?? 0);
  return shownDigits(formatDecimal(decimals === undefined ? decimal : roundToScale(decimal, decimals)), language);
}

/**
 * A number to so many significant digits, without an exponent: axes, tooltips, readouts.
 * @throws RangeError when it is not finite
 */
export function significantNumber(value: number, digits: number, language: Language): string {
  const decimal = decimalOf(value);
  const length = (decimal.digits < 0n ? -decimal.digits : decimal.digits).toString().length;
  const scale = decimal.digits === 0n ? 0 : decimal.scale - length + digits;
  return shownDigits(formatDecimal(roundToScale(decimal, Math.min(scale, 12))), language);
}

/** "0.28 %": a fraction in percent, two significant digits under ten percent, whole percents above. */
export function percentText(fraction: number, language: Language): string {
  const percent = fraction * 100;
  const digits = Math.abs(percent) < 10 ? 2 : 3;
  const space = NO_BREAK;
  return `${significantNumber(percent, digits, language)}${space}%`;
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

const padded = (whole: bigint, length = 2) => whole.toString().padStart(length, "0");

function sexagesimal(seconds: Decimal, language: Language, marks: [string, string, string]): string {
  const size = seconds.digits < 0n ? -seconds.digits : seconds.digits;
  const unit = 10n ** BigInt(seconds.scale);
  const whole = size / unit;
  const rest = formatDecimal({ digits: (whole % 60n) * unit + (size % unit), scale: seconds.scale });
  const second = shownDigits(rest.split(".")[0]?.length === 1 ? `0${rest}` : rest, language);
  return [
    `${padded(whole / 3600n)}${marks[0]}`,
    `${padded((whole / 60n) % 60n)}${marks[1]}`,
    `${second}${marks[2]}`,
  ].join(NO_BREAK);
}

/** "18 h 36 m 56.34 s": a right ascension (degrees, 0 to 360) to hundredths of a second of time. */
export function rightAscensionText(raDeg: number, language: Language): string {
  const seconds = roundToScale(decimalOf(raDeg * 240), 2);
  const day = 8_640_000n;
  return sexagesimal({ digits: seconds.digits % day, scale: 2 }, language, ["h", "m", "s"]);
}

/** "+38° 47′ 01.3″": a declination (degrees, -90 to 90) to tenths of an arcsecond. */
export function declinationText(decDeg: number, language: Language): string {
  const seconds = roundToScale(decimalOf(decDeg * 3600), 1);
  const sign = decDeg < 0 ? "\u2212" : "+";
  return sign + sexagesimal(seconds, language, ["°", "′", "″"]);
}

/** "31.01°" */
export function degreesText(degrees: number, language: Language, decimals = 2): string {
  return `${plainNumber(degrees, language, decimals)}°`;
}

/** "J1991.25" */
export function epochText(epoch: string): string {
  return `J${formatDecimal(parseDecimal(epoch))}`;
}
