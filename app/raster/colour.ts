/** Linear light, 0 to 1 a channel (above 1 is brighter than the screen and is held at 1 when resolved). */
export type Rgb = readonly [red: number, green: number, blue: number];

/** The sRGB transfer curve and its inverse. Source: IEC 61966-2-1. */
export function linearFromSrgb(value: number): number {
  return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
}

export function srgbFromLinear(value: number): number {
  return value <= 0.0031308 ? value * 12.92 : 1.055 * value ** (1 / 2.4) - 0.055;
}

/** "#0a0f1c" to linear light. @throws RangeError when it is not six hexadecimal digits after "#" */
export function linearFromHex(hex: string): Rgb {
  const digits = /^#([0-9a-f]{2})([0-9a-f]{2})([0-9a-f]{2})$/i.exec(hex);
  if (!digits) throw new RangeError(`"${hex}" is not a colour as #rrggbb`);
  const channel = (at: number) => linearFromSrgb(Number.parseInt(digits[at] ?? "0", 16) / 255);
  return [channel(1), channel(2), channel(3)];
}
