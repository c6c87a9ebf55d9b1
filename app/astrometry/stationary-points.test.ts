import fc from "fast-check";
import { expect, test } from "vitest";
import { stationaryPoints } from "./stationary-points.ts";

const powerOfTen = (low: number, high: number) => fc.double({ min: low, max: high, noNaN: true }).map((e) => 10 ** e);

test("every point found makes the slope zero, to its rounding", () => {
  fc.assert(
    fc.property(
      fc.constantFrom(2, 3),
      fc.tuple(fc.constantFrom(-1, 1), powerOfTen(-6, 6)).map(([sign, size]) => sign * size),
      powerOfTen(-8, 8),
      (power, snr, scale) => {
        for (const x of stationaryPoints(power, snr, scale)) {
          const terms = [power, -x / scale, -snr / x, 1 / (x * x)];
          const slope = terms.reduce((sum, term) => sum + term, 0);
          const size = Math.max(...terms.map(Math.abs));
          expect(Math.abs(slope)).toBeLessThan(1e-13 * size);
        }
      },
    ),
  );
});

test("points ascend, and are one or three with a scale", () => {
  fc.assert(
    fc.property(fc.double({ min: -10, max: 20, noNaN: true }), powerOfTen(-3, 4), (snr, scale) => {
      const found = stationaryPoints(2, snr, scale);
      expect([1, 3]).toContain(found.length);
      expect(found).toEqual([...found].sort((a, b) => a - b));
    }),
  );
});

test("three appear where the error times the length exceeds parallax over error", () => {
  expect(stationaryPoints(2, 4, 6.75)).toHaveLength(3);
  expect(stationaryPoints(2, 10, 1.35)).toHaveLength(1);
  expect(stationaryPoints(2, -4, 6.75)).toHaveLength(1);
});

test("without a scale: a maximum and a minimum, a maximum alone, or an endless climb", () => {
  expect(stationaryPoints(2, 3, Number.POSITIVE_INFINITY)).toEqual([0.5, 1]);
  expect(stationaryPoints(0, 4, Number.POSITIVE_INFINITY)).toEqual([0.25]);
  expect(stationaryPoints(2, 2, Number.POSITIVE_INFINITY)).toEqual([]);
  expect(stationaryPoints(0, -1, Number.POSITIVE_INFINITY)).toEqual([]);
});
