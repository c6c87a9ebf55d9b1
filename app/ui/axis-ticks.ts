import type { Domain } from "./spread-geometry.ts";

/**
 * Round numbers inside a log axis, about `count` of them: powers of ten (with 2 and 5 where there is room) on a long axis,
 * equal steps of 1, 2 or 5 on a short one. Plain numbers: their words come from the caller.
 */
export function axisTicks([min, max]: Domain, count = 4): number[] {
  const decades = Math.log10(max / min);
  if (decades < 1) return linearTicks(min, max, count);
  const digits = decades * 3 <= count + 1 ? [1, 2, 5] : [1];
  const stride = Math.max(1, Math.ceil((decades * digits.length) / (count + 1)));
  const ticks: number[] = [];
  for (let power = Math.floor(Math.log10(min)); power <= Math.ceil(Math.log10(max)); power += 1) {
    if (power % stride !== 0) continue;
    for (const digit of digits) ticks.push(exact(digit, power));
  }
  return ticks.filter((tick) => tick >= min && tick <= max);
}

function linearTicks(min: number, max: number, count: number): number[] {
  const rough = (max - min) / count;
  const power = Math.floor(Math.log10(rough));
  const digit = [1, 2, 5, 10].find((step) => exact(step, power) >= rough) ?? 10;
  const first = Math.ceil(min / exact(digit, power));
  const ticks: number[] = [];
  // Whole multiples, so that 24.9 does not come out as 24.900000000000002.
  for (let multiple = first; exact(multiple * digit, power) <= max; multiple += 1) {
    ticks.push(exact(multiple * digit, power));
  }
  return ticks;
}

/** digit x 10^power without the error of a multiplication by 0.1. */
function exact(digit: number, power: number): number {
  return power < 0 ? digit / 10 ** -power : digit * 10 ** power;
}
