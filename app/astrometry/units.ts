/**
 * Units of length and of angle.
 * Sources: au, IAU 2012 Resolution B2; parsec, implied by IAU 2015 Resolution B2; c, SI; Julian year of 365.25 days of
 * 86 400 s, IAU style manual. All exact by definition; the digits below are the nearest doubles.
 */

/** Astronomical unit, metres. */
export const AU_M = 149_597_870_700;
/** Speed of light, metres a second. */
export const LIGHT_M_PER_S = 299_792_458;
/** Julian year, seconds. */
export const JULIAN_YEAR_S = 31_557_600;
/** Light-year (the Julian year's), metres. */
export const LY_M = LIGHT_M_PER_S * JULIAN_YEAR_S;
/** Astronomical units in a parsec: 648000/pi. */
export const PC_AU = 648_000 / Math.PI;
/** Parsec, metres. */
export const PC_M = PC_AU * AU_M;
/** Light-years in a parsec. */
export const PC_LY = PC_M / LY_M;
/** One au a Julian year, kilometres a second. */
export const AU_PER_YEAR_KM_S = AU_M / 1000 / JULIAN_YEAR_S;

export type LengthUnit = "pc" | "ly" | "au" | "km" | "m" | "kpc" | "Mpc";
export type AngleUnit = "deg" | "arcmin" | "arcsec" | "mas" | "uas" | "rad";

const METRES: Record<LengthUnit, number> = {
  m: 1,
  km: 1000,
  au: AU_M,
  ly: LY_M,
  pc: PC_M,
  kpc: PC_M * 1e3,
  Mpc: PC_M * 1e6,
};

const MICROARCSECONDS: Record<AngleUnit, number> = {
  uas: 1,
  mas: 1e3,
  arcsec: 1e6,
  arcmin: 6e7,
  deg: 3.6e9,
  rad: PC_AU * 1e6,
};

/** Multiplies or divides by a factor of at least one, so that whole ratios (1000 mas an arcsec) lose nothing. */
function rescale<U extends string>(what: string, sizes: Record<U, number>, value: number, from: U, to: U): number {
  for (const unit of [from, to]) {
    if (!Object.hasOwn(sizes, unit)) throw new RangeError(`${what} unit "${unit}" is not known`);
  }
  if (Number.isNaN(value)) throw new RangeError(`${what} value must be a number`);
  if (from === to) return value;
  const [fromSize, toSize] = [sizes[from], sizes[to]];
  return fromSize >= toSize ? value * (fromSize / toSize) : value / (toSize / fromSize);
}

/**
 * A length in another unit. Any sign; infinities pass (the far end of a range may be one).
 * @throws RangeError when the value is NaN or a unit is not known
 */
export function convertLength(value: number, from: LengthUnit, to: LengthUnit): number {
  return rescale("length", METRES, value, from, to);
}

/**
 * An angle in another unit. Any sign; not brought back to one turn.
 * @throws RangeError when the value is NaN or a unit is not known
 */
export function convertAngle(value: number, from: AngleUnit, to: AngleUnit): number {
  return rescale("angle", MICROARCSECONDS, value, from, to);
}
