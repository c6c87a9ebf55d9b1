/**
 * Decimal numbers as text, without binary floating point: (1.005).toFixed(2) is "1.00", and a visitor would read it.
 * A Decimal is digits * 10^-scale; scale may be negative.
 */
export interface Decimal {
  digits: bigint;
  scale: number;
}

const DECIMAL = /^([+\-\u2212])?(\d+(?:\.\d*)?|\.\d+)(?:[eE]([+\-\u2212]?\d{1,4}))?$/;

/**
 * Reads "12.50", "-3", ".5", "1.2e-3" (ASCII or typographic minus). Trailing zeros count: "100.0" has scale 1.
 * @throws RangeError for anything else
 */
export function parseDecimal(text: string): Decimal {
  const match = DECIMAL.exec(text.trim());
  if (!match) throw new RangeError(`"${text}" is not a decimal number`);
  const [, sign, mantissa = "", exponent = "0"] = match;
  const [whole = "", fraction = ""] = mantissa.split(".");
  const digits = BigInt(whole + fraction || "0");
  const scale = fraction.length - Number(exponent.replace("\u2212", "-"));
  return { digits: sign && sign !== "+" ? -digits : digits, scale };
}

/** The shortest decimal number that reads back as this double: 0.1 is 0.1. @throws RangeError when it is not finite */
export function decimalOf(value: number): Decimal {
  if (!Number.isFinite(value)) throw new RangeError(`${value} is not a finite number`);
  return parseDecimal(String(value));
}

/** Plain notation: "-0.012", "1230". A zero never has a sign. */
export function formatDecimal({ digits, scale }: Decimal): string {
  const sign = digits < 0n ? "-" : "";
  const plain = (digits < 0n ? -digits : digits).toString();
  if (scale <= 0) return sign + (digits === 0n ? "0" : plain + "0".repeat(-scale));
  const padded = plain.padStart(scale + 1, "0");
  return `${sign}${padded.slice(0, -scale)}.${padded.slice(-scale)}`;
}

const tenTo = (power: number) => 10n ** BigInt(power);

/** Rounds to a scale (2: hundredths, 0: units, -1: tens), half away from zero. Adds zeros where it is finer. */
export function roundToScale(value: Decimal, scale: number): Decimal {
  if (scale >= value.scale) return { digits: value.digits * tenTo(scale - value.scale), scale };
  const divisor = tenTo(value.scale - scale);
  const size = value.digits < 0n ? -value.digits : value.digits;
  const rounded = (size * 2n + divisor) / (divisor * 2n);
  return { digits: value.digits < 0n ? -rounded : rounded, scale };
}

export function compareDecimals(a: Decimal, b: Decimal): number {
  const scale = Math.max(a.scale, b.scale);
  const difference = roundToScale(a, scale).digits - roundToScale(b, scale).digits;
  return difference < 0n ? -1 : difference > 0n ? 1 : 0;
}

export function subtractDecimals(a: Decimal, b: Decimal): Decimal {
  const scale = Math.max(a.scale, b.scale);
  return { digits: roundToScale(a, scale).digits - roundToScale(b, scale).digits, scale };
}

/** How many digits there are from the first that is not zero: 3 for 103, 3 for 0.00103, 4 for 10.30. 0 for zero. */
export function significantLength({ digits }: Decimal): number {
  return digits === 0n ? 0 : (digits < 0n ? -digits : digits).toString().length;
}

/** Exact multiplication by a whole number: degrees to seconds of arc. */
export function timesWhole({ digits, scale }: Decimal, factor: bigint): Decimal {
  return { digits: digits * factor, scale };
}

/** Exact multiplication by a power of ten: only the place moves. */
export function timesTenTo({ digits, scale }: Decimal, power: number): Decimal {
  return { digits, scale: scale - power };
}

/** Rounds to so many leading digits, again after a carry: 99.96 to three is 100, not 100.0. Zero is plain 0. */
export function toSignificant(value: Decimal, count: number): Decimal {
  if (value.digits === 0n) return { digits: 0n, scale: 0 };
  const rounded = roundToScale(value, value.scale - significantLength(value) + count);
  if (significantLength(rounded) === count) return rounded;
  return roundToScale(rounded, rounded.scale - 1);
}

/** The whole number at or below: -0.5 is -1. */
export function floorDecimal({ digits, scale }: Decimal): bigint {
  if (scale <= 0) return digits * tenTo(-scale);
  const quotient = digits / tenTo(scale);
  return digits < 0n && digits % tenTo(scale) !== 0n ? quotient - 1n : quotient;
}
