/**
 * The log density  k ln x - x/lambda - (w - 1/x)^2 / 2,  x > 0, in distance times parallax error: its stationary
 * points. With y = 1/x they are the positive roots of  y^3 - w y^2 + k y - 1/lambda  (Bailer-Jones 2015, PASP 127, 994;
 * Astraatmadja & Bailer-Jones 2016, ApJ 832, 137, there in r).
 */

interface Cubic {
  power: number;
  snr: number;
  inverseScale: number;
}

const valueAt = (c: Cubic, y: number) => ((y - c.snr) * y + c.power) * y - c.inverseScale;
const slopeAt = (c: Cubic, y: number) => (3 * y - 2 * c.snr) * y + c.power;

/** The root in a bracket of one sign change: Newton in ln y, and halves of ln y where Newton leaves the bracket. */
function rootBetween(cubic: Cubic, from: number, to: number): number {
  let [low, high] = [from, to];
  const rises = valueAt(cubic, high) > 0;
  let y = Math.sqrt(low) * Math.sqrt(high);
  for (let turn = 0; turn < 200; turn++) {
    const value = valueAt(cubic, y);
    if (value === 0) return y;
    if (value > 0 === rises) high = y;
    else low = y;
    const newton = y * Math.exp(-value / (slopeAt(cubic, y) * y));
    const next = newton > low && newton < high ? newton : Math.sqrt(low) * Math.sqrt(high);
    if (Math.abs(next - y) <= 2 * Number.EPSILON * y) return next;
    y = next;
  }
  return y;
}

/** Two brackets' ends that hold every positive root: each term of the cubic is weighed against 1/lambda alone. */
function outerBracket({ power, snr, inverseScale }: Cubic): [number, number] {
  const quarter = inverseScale / 4;
  const low = Math.min(Math.cbrt(quarter), quarter / power, snr < 0 ? Math.sqrt(quarter / -snr) : Number.MAX_VALUE);
  return [low, 1.0001 * (Math.max(snr, 0) + Math.cbrt(inverseScale))];
}

function cubicRoots(cubic: Cubic): number[] {
  const [low, high] = outerBracket(cubic);
  const { snr, power } = cubic;
  const discriminant = snr * snr - 3 * power;
  if (snr <= 0 || discriminant <= 0) return [rootBetween(cubic, low, high)];
  const lowerTurn = (snr + Math.sqrt(discriminant)) / 3;
  const upperTurn = power / 3 / lowerTurn;
  // q climbs to `upperTurn`, falls to `lowerTurn`, and climbs again.
  if (valueAt(cubic, upperTurn) <= 0) return [rootBetween(cubic, lowerTurn, high)];
  if (valueAt(cubic, lowerTurn) >= 0) return [rootBetween(cubic, low, upperTurn)];
  return [
    rootBetween(cubic, lowerTurn, high),
    rootBetween(cubic, upperTurn, lowerTurn),
    rootBetween(cubic, low, upperTurn),
  ];
}

function quadraticRoots({ power, snr }: Cubic): number[] {
  if (snr <= 0) return [];
  if (power === 0) return [snr];
  const discriminant = snr * snr - 4 * power;
  if (discriminant <= 0) return [];
  const larger = (snr + Math.sqrt(discriminant)) / 2;
  return [larger, power / larger];
}

/**
 * Stationary points in ascending x: maximum, minimum, maximum... The density climbs from x = 0 to the first.
 * @param power k, 0 or above (above 0 when there is a scale)
 * @param snr w, parallax over its error, any sign, at most 1e60
 * @param scale lambda, prior's length times parallax error; Infinity for none
 * @returns one or three with a scale, none to two without
 */
export function stationaryPoints(power: number, snr: number, scale: number): number[] {
  const cubic = { power, snr, inverseScale: 1 / scale };
  const roots = cubic.inverseScale === 0 ? quadraticRoots(cubic) : cubicRoots(cubic);
  return roots.map((y) => 1 / y);
}
