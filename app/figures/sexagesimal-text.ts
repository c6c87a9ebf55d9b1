import { type Decimal, decimalOf, formatDecimal, roundToScale, timesWhole } from "./decimal.ts";
import { type Language, NO_BREAK, shownDigits } from "./language.ts";

const two = (whole: bigint) => whole.toString().padStart(2, "0");

/** Seconds, not negative, as three sixties with their marks. */
function sexagesimal(seconds: Decimal, language: Language, marks: [string, string, string]): string {
  const unit = 10n ** BigInt(seconds.scale);
  const whole = seconds.digits / unit;
  const rest = formatDecimal({ digits: seconds.digits % (60n * unit), scale: seconds.scale });
  const second = shownDigits((whole % 60n < 10n ? "0" : "") + rest, language);
  return [`${two(whole / 3600n)}${marks[0]}`, `${two((whole / 60n) % 60n)}${marks[1]}`, `${second}${marks[2]}`].join(
    NO_BREAK,
  );
}

/**
 * "18h 36m 56.34s": a right ascension in hours, minutes and seconds of time; 24h 00m is 00h 00m.
 * @param raDeg degrees, 0 to 360
 * @param decimals of the seconds, 0 to 12; two of time are as fine as one of arc and a bit
 * @throws RangeError outside 0 to 360
 */
export function rightAscensionText(raDeg: number, language: Language, decimals = 2): string {
  if (!(raDeg >= 0 && raDeg <= 360)) throw new RangeError(`a right ascension is from 0 to 360 degrees, not ${raDeg}`);
  const { digits, scale } = roundToScale(timesWhole(decimalOf(raDeg), 240n), decimals);
  const day = 86_400n * 10n ** BigInt(decimals);
  return sexagesimal({ digits: digits % day, scale }, language, ["h", "m", "s"]);
}

/**
 * "+38° 47′ 01.3″": a declination in degrees, minutes and seconds of arc, always with its sign.
 * @param decDeg degrees, -90 to 90
 * @param decimals of the seconds, 0 to 12
 * @throws RangeError outside -90 to 90
 */
export function declinationText(decDeg: number, language: Language, decimals = 1): string {
  if (!(decDeg >= -90 && decDeg <= 90)) throw new RangeError(`a declination is from -90 to 90 degrees, not ${decDeg}`);
  const { digits, scale } = roundToScale(timesWhole(decimalOf(decDeg), 3600n), decimals);
  const sign = digits < 0n ? "\u2212" : "+";
  return sign + sexagesimal({ digits: digits < 0n ? -digits : digits, scale }, language, ["°", "′", "″"]);
}
