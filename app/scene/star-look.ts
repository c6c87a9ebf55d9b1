import { linearSrgbFromTemperature, temperatureFromBv } from "#app/astrometry/photometry.ts";

export type Rgb = [red: number, green: number, blue: number];

/** A star of unknown colour is drawn as the Sun's, B-V 0.65 (from memory), not as white. */
const UNKNOWN_BV = 0.65;
const BLUEST = -0.4;
const REDDEST = 2;

/** Linear sRGB, brightest channel 1. Colour indices beyond what the formula is for are held at its ends. */
export function starColour(bv: number | null): Rgb {
  const held = Math.min(Math.max(bv ?? UNKNOWN_BV, BLUEST), REDDEST);
  const [red, green, blue] = linearSrgbFromTemperature(temperatureFromBv(held));
  return [red, green, blue];
}

const SMALLEST_PX = 2.4;
const LARGEST_PX = 8;
const UNKNOWN_V = 4;

/** Radius of the drawn light, px: grows with brightness as seen from here; a sign of brightness, not a size. */
export function starSizePx(vMag: number | null): number {
  const size = 6.4 - 0.62 * (vMag ?? UNKNOWN_V);
  return Math.min(Math.max(size, SMALLEST_PX), LARGEST_PX);
}
