import { expect, test } from "vitest";
import { axisTicks } from "./axis-ticks.ts";

test("a short axis gets equal round steps without binary dust", () => {
  expect(axisTicks([24.87, 25.21], 4)).toEqual([24.9, 25, 25.1, 25.2]);
  expect(axisTicks([126, 133], 4)).toEqual([126, 128, 130, 132]);
});

test("a long axis gets powers of ten, with 2 and 5 where there is room", () => {
  expect(axisTicks([1, 10], 4)).toEqual([1, 2, 5, 10]);
  expect(axisTicks([3, 40_000], 4)).toEqual([10, 100, 1000, 10_000]);
});

test("a very long axis skips decades", () => {
  const ticks = axisTicks([1e-6, 1e9], 4);
  expect(ticks.length).toBeGreaterThanOrEqual(3);
  expect(ticks.length).toBeLessThanOrEqual(6);
  expect(ticks).toContain(1);
});

test("every tick lies inside its axis and they rise", () => {
  for (const domain of [
    [0.011, 0.0134],
    [4.2, 4.3],
    [99, 1010],
    [1, 9.9],
  ] as const) {
    const ticks = axisTicks(domain);
    expect(ticks.length).toBeGreaterThan(0);
    for (const tick of ticks) {
      expect(tick).toBeGreaterThanOrEqual(domain[0]);
      expect(tick).toBeLessThanOrEqual(domain[1]);
    }
    expect(ticks.toSorted((a, b) => a - b)).toEqual(ticks);
  }
});
