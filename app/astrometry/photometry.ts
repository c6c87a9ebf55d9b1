import { colourMatching } from "./colour-matching.ts";

/** Second radiation constant h c / k of the 2019 SI, nm K. */
const C2_NM_K = (6.62607015e-34 * 299_792_458 * 1e9) / 1.380649e-23;
const FIRST_NM = 360;
const LAST_NM = 830;

/** CIE XYZ to linear sRGB: the inverse of the primaries and D65 white of IEC 61966-2-1 (x, y to four places). */
const SRGB = [
  [3.2409699419045213, -1.5373831775700935, -0.4986107602930033],
  [-0.9692436362808798, 1.8759675015077206, 0.04155505740717561],
  [0.05563007969699361, -0.20397695888897657, 1.0569715142428786],
] as const;

/** Shape (471, 3): the observer at every nanometre. */
const OBSERVER = Array.from({ length: LAST_NM - FIRST_NM + 1 }, (_, i) => colourMatching(FIRST_NM + i));

/**
 * Effective temperature of a star from its colour.
 * T = 4600 (1 / (0.92 (B-V) + 1.7) + 1 / (0.92 (B-V) + 0.62)): Ballesteros 2012, EPL 97, 34008.
 * @param bv B-V, magnitudes, above -0.62/0.92 (about -0.674), where the formula has its pole; stars lie within -0.4 and 2.5
 * @returns kelvin
 * @throws RangeError when B-V is not finite or not above the pole
 */
export function temperatureFromBv(bv: number): number {
  const denominator = 0.92 * bv + 0.62;
  if (!Number.isFinite(bv) || denominator <= 0) throw new RangeError("bv must be a finite number above -0.673");
  return 4600 * (1 / (0.92 * bv + 1.7) + 1 / denominator);
}

/** Planck's law, its exponent at 830 nm taken out so that neither cold nor hot bodies leave the doubles' range. */
function planck(nm: number, kelvin: number): number {
  const exponent = C2_NM_K / (nm * kelvin);
  const brightest = C2_NM_K / (LAST_NM * kelvin);
  return Math.exp(brightest - exponent) / (-Math.expm1(-exponent) * (nm / 555) ** 5);
}

/**
 * Colour of a black body on a screen: Planck's law through the CIE 1931 2-degree observer (`colourMatching`) to linear
 * sRGB, the largest channel at one. A channel outside the screen's gamut (blue below about 1900 K) is held at zero.
 * @param kelvin 500 to 1e12: what lies beyond takes the colour at the edge (pure red, pale blue); colder than 500 K
 * the fit's far red tail, which no eye sees, would decide
 * @returns linear red, green, blue, 0 to 1
 * @throws RangeError when the temperature is not a finite number above zero
 */
export function linearSrgbFromTemperature(kelvin: number): [red: number, green: number, blue: number] {
  if (!Number.isFinite(kelvin) || kelvin <= 0) throw new RangeError("kelvin must be a finite number above zero");
  const within = Math.min(Math.max(kelvin, 500), 1e12);
  const xyz = [0, 0, 0] as [number, number, number];
  OBSERVER.forEach(([x, y, z], i) => {
    const radiance = planck(FIRST_NM + i, within);
    xyz[0] += x * radiance;
    xyz[1] += y * radiance;
    xyz[2] += z * radiance;
  });
  const rgb = SRGB.map((row) => Math.max(0, row[0] * xyz[0] + row[1] * xyz[1] + row[2] * xyz[2]));
  const largest = Math.max(...rgb);
  return [rgb[0]! / largest, rgb[1]! / largest, rgb[2]! / largest];
}
