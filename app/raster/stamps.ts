/** Places a stamp can stand at inside a pixel, a side. */
export const PHASES = 4;
const SIZE_STEPS = 4;
/** The light of a star with a halo ends at so many times its size, that of a small one sooner: it has none. */
const HALO_REACH = 6;
const CORE_REACH = 2.4;
/** Below the first size, px, there is no halo; from the second on it is whole. */
const HALO_FROM_PX = 1.5;
const HALO_WHOLE_PX = 3;

const haloOf = (size: number) => Math.min(Math.max((size - HALO_FROM_PX) / (HALO_WHOLE_PX - HALO_FROM_PX), 0), 1);
const reachOf = (size: number) => (size > HALO_FROM_PX ? HALO_REACH : CORE_REACH);

/** The light of one star of a size at one place inside its pixel: `side` by `side` values around `middle`. */
export interface Stamp {
  side: number;
  /** The column and row of the pixel that the star stands in. */
  middle: number;
  values: Float32Array;
}

const stamps = new Map<number, Stamp>();

/**
 * @param sizePx radius of the bright core
 * @param phaseX @param phaseY 0 to PHASES - 1: where in its pixel the star stands
 */
export function stampOf(sizePx: number, phaseX: number, phaseY: number): Stamp {
  const step = Math.max(1, Math.round(sizePx * SIZE_STEPS));
  const key = (step * PHASES + phaseY) * PHASES + phaseX;
  let stamp = stamps.get(key);
  if (!stamp) {
    stamp = makeStamp(step / SIZE_STEPS, (phaseX + 0.5) / PHASES, (phaseY + 0.5) / PHASES);
    stamps.set(key, stamp);
  }
  return stamp;
}

/** A core that is brighter than the screen, a soft shoulder, and a faint halo that ends at nothing. */
function profile(radius: number, size: number): number {
  const r = radius / size;
  if (r >= reachOf(size)) return 0;
  const core = 3 * Math.exp(-2.6 * r * r);
  const halo = haloOf(size);
  const fade = 1 - r / HALO_REACH;
  return core + halo * (0.22 * Math.exp(-0.6 * r * r) + 0.06 * fade * fade);
}

/** All stamps of one size carry the same flux: a star must not flicker while it moves through a pixel. */
function makeStamp(size: number, x: number, y: number): Stamp {
  const middle = Math.ceil(size * reachOf(size));
  const side = middle * 2 + 1;
  const values = new Float32Array(side * side);
  let sum = 0;
  for (let row = 0; row < side; row++) {
    for (let column = 0; column < side; column++) {
      const value = sampled(column - middle - x, row - middle - y, size);
      values[row * side + column] = value;
      sum += value;
    }
  }
  const scale = fluxOf(size) / sum;
  for (let at = 0; at < values.length; at++) values[at] = values[at]! * scale;
  return { side, middle, values };
}

const SAMPLES = 4;

/** The mean over one pixel whose corner is at (left, top) from the star. */
function sampled(left: number, top: number, size: number): number {
  let sum = 0;
  for (let v = 0; v < SAMPLES; v++) {
    for (let u = 0; u < SAMPLES; u++) {
      const dx = left + (u + 0.5) / SAMPLES;
      const dy = top + (v + 0.5) / SAMPLES;
      sum += profile(Math.sqrt(dx * dx + dy * dy), size);
    }
  }
  return sum / (SAMPLES * SAMPLES);
}

/** The profile's whole light over the plane, by the midpoint rule in rings. */
export function fluxOf(size: number): number {
  const rings = 400;
  const width = (reachOf(size) * size) / rings;
  let flux = 0;
  for (let ring = 0; ring < rings; ring++) {
    const radius = (ring + 0.5) * width;
    flux += profile(radius, size) * 2 * Math.PI * radius * width;
  }
  return flux;
}
