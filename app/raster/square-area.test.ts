import fc from "fast-check";
import { expect, test } from "vitest";
import { areaBefore, areaInBands } from "./square-area.ts";

const angle = fc.double({ min: 0, max: 2 * Math.PI, noNaN: true });
const distance = fc.double({ min: -1, max: 1, noNaN: true });
const EVERYWHERE = { nx: 1, ny: 0, low: -9, high: 9 };

test("an edge through the middle halves a pixel at every angle; far off it leaves all or nothing", () => {
  fc.assert(
    fc.property(angle, (turn) => {
      const [nx, ny] = [Math.cos(turn), Math.sin(turn)];
      expect(areaBefore(nx, ny, 0)).toBeCloseTo(0.5, 12);
      expect(areaBefore(nx, ny, 0.71)).toBe(1);
      expect(areaBefore(nx, ny, -0.71)).toBe(0);
    }),
  );
});

test("the closed form and the cut polygon agree", () => {
  fc.assert(
    fc.property(angle, distance, (turn, at) => {
      const band = { nx: Math.cos(turn), ny: Math.sin(turn), low: -9, high: at };
      expect(areaInBands(band, EVERYWHERE)).toBeCloseTo(areaBefore(band.nx, band.ny, at), 12);
    }),
  );
});

test("a quarter turned by 45 degrees: the corner beyond the edge is a triangle of known area", () => {
  const half = Math.SQRT1_2;
  // The edge x + y = 1/2 cuts off a triangle with legs of 1/2.
  expect(areaBefore(half, half, half / 2)).toBeCloseTo(1 - 0.125, 12);
});
