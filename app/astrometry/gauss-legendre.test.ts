import { expect, test } from "vitest";
import { gaussLegendre } from "./gauss-legendre.ts";

test("n nodes integrate every power up to 2n - 1", () => {
  for (const count of [2, 3, 8, 16, 33, 64]) {
    const { nodes, weights } = gaussLegendre(count);
    for (let power = 0; power < 2 * count; power++) {
      const sum = nodes.reduce((total, x, i) => total + weights[i]! * x ** power, 0);
      expect(sum).toBeCloseTo(power % 2 === 0 ? 2 / (power + 1) : 0, 13);
    }
  }
});

test("nodes ascend inside the interval, weights are positive", () => {
  const { nodes, weights } = gaussLegendre(16);
  expect([...nodes]).toEqual([...nodes].sort((a, b) => a - b));
  expect(nodes[0]!).toBeGreaterThan(-1);
  expect(nodes[15]!).toBeLessThan(1);
  expect(Math.min(...weights)).toBeGreaterThan(0);
});

test("a count that is no whole number from 2 to 64 is refused", () => {
  for (const count of [0, 1, 2.5, 65, Number.NaN]) expect(() => gaussLegendre(count)).toThrow(RangeError);
});
