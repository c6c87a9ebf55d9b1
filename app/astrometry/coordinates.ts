import { parseSexagesimal } from "./sexagesimal.ts";

/** Shape (3): towards RA 0, Dec 0; towards RA 90; towards Dec 90 (or the Galactic axes). */
export type Vector = [x: number, y: number, z: number];

const DEG = Math.PI / 180;

/**
 * ICRS to Galactic: the fixed rotation of Hipparcos, vol. 1, section 1.5.3 (ESA SP-1200, 1997), in the digits of
 * ERFA's `icrs2g`, which takes its three angles as exact. Going through FK5 instead differs by about 20 mas.
 */
const GALACTIC: readonly [Vector, Vector, Vector] = [
  [-0.054875560416215365, -0.873437090234885, -0.4838350155487132],
  [0.49410942787558365, -0.4448296299600112, 0.7469822444972188],
  [-0.8676661490190047, -0.19807637343120152, 0.4559837761750669],
];

/**
 * A right ascension in degrees. One bare number is degrees; parts without marks, or led by h, are hours; parts led by
 * a degree mark are degrees.
 * @returns degrees, 0 (included) to 360 (excluded)
 * @throws RangeError when the text is no angle, is negative, or goes beyond a turn
 */
export function parseRightAscension(text: string): number {
  const { sign, leading, magnitude } = parseSexagesimal(text);
  const inHours = leading === "hours" || leading === "unmarked";
  if (sign < 0 && magnitude > 0) throw new RangeError(`"${text}": a right ascension is never negative`);
  if (magnitude >= (inHours ? 24 : 360)) {
    throw new RangeError(`"${text}": a right ascension must be below ${inHours ? "24 hours" : "360 degrees"}`);
  }
  return inHours ? magnitude * 15 : magnitude;
}

/**
 * A declination in degrees, with its sign also where the degrees are zero ("-00 30 00" is -0.5).
 * @returns degrees, -90 to 90
 * @throws RangeError when the text is no angle, is in hours, or goes beyond a pole
 */
export function parseDeclination(text: string): number {
  const { sign, leading, magnitude } = parseSexagesimal(text);
  if (leading === "hours") throw new RangeError(`"${text}": a declination is in degrees, not in hours`);
  if (magnitude > 90) throw new RangeError(`"${text}": a declination must be between -90 and 90 degrees`);
  return magnitude === 0 ? 0 : sign * magnitude;
}

function requireDirection(raDeg: number, decDeg: number): void {
  if (!Number.isFinite(raDeg)) throw new RangeError("raDeg must be a finite number");
  if (!Number.isFinite(decDeg) || Math.abs(decDeg) > 90) throw new RangeError("decDeg must be between -90 and 90");
}

/**
 * Unit vector of a direction.
 * @param raDeg degrees, any turn
 * @param decDeg degrees, -90 to 90
 * @throws RangeError naming the parameter that is not finite or beyond a pole
 */
export function icrsUnitVector(raDeg: number, decDeg: number): Vector {
  requireDirection(raDeg, decDeg);
  const [ra, dec] = [raDeg * DEG, decDeg * DEG];
  return [Math.cos(ra) * Math.cos(dec), Math.sin(ra) * Math.cos(dec), Math.sin(dec)];
}

const dot = (a: Vector, b: Vector) => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];

function galacticUnitVector(raDeg: number, decDeg: number): Vector {
  const icrs = icrsUnitVector(raDeg, decDeg);
  return [dot(GALACTIC[0], icrs), dot(GALACTIC[1], icrs), dot(GALACTIC[2], icrs)];
}

/**
 * Galactic longitude and latitude of an ICRS direction, as ERFA's `icrs2g`.
 * @param raDeg degrees, any turn
 * @param decDeg degrees, -90 to 90
 * @returns degrees; l 0 (included) to 360 (excluded), b -90 to 90
 * @throws RangeError naming the parameter that is not finite or beyond a pole
 */
export function icrsToGalactic(raDeg: number, decDeg: number): { lDeg: number; bDeg: number } {
  const [x, y, z] = galacticUnitVector(raDeg, decDeg);
  const lDeg = Math.atan2(y, x) / DEG;
  const turned = lDeg < 0 ? lDeg + 360 : lDeg;
  return { lDeg: turned >= 360 ? 0 : turned, bDeg: Math.atan2(z, Math.hypot(x, y)) / DEG };
}

/**
 * Galactic Cartesian coordinates: x towards the centre, y towards rotation, z towards the north pole.
 * @param distance in any unit, 0 or above; the answer is in the same
 * @throws RangeError naming the parameter that is not finite, negative, or beyond a pole
 */
export function galacticXyz(raDeg: number, decDeg: number, distance: number): { x: number; y: number; z: number } {
  if (!Number.isFinite(distance) || distance < 0) throw new RangeError("distance must be a number of at least zero");
  const [x, y, z] = galacticUnitVector(raDeg, decDeg);
  return { x: x * distance, y: y * distance, z: z * distance };
}

/**
 * Angle between two directions, by the arc tangent of cross over dot product: sharp at 0 and at 180 degrees alike
 * (as ERFA's `sepp`).
 * @returns degrees, 0 to 180
 * @throws RangeError naming the parameter that is not finite or beyond a pole
 */
export function angularSeparationDeg(ra1Deg: number, dec1Deg: number, ra2Deg: number, dec2Deg: number): number {
  const a = icrsUnitVector(ra1Deg, dec1Deg);
  const b = icrsUnitVector(ra2Deg, dec2Deg);
  const cross = Math.hypot(a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]);
  return Math.atan2(cross, dot(a, b)) / DEG;
}
