import fc from "fast-check";
import { expect, test } from "vitest";
import { addEdge, coverageOf, createArea } from "./area.ts";

function polygon(corners: [number, number][]) {
  const area = createArea(20, 20);
  for (const [at, [x, y]] of corners.entries()) {
    const [nextX, nextY] = corners[(at + 1) % corners.length]!;
    addEdge(area, x, y, nextX, nextY);
  }
  return coverageOf(area);
}

test("a rectangle covers each pixel by exactly the share it lies on", () => {
  const coverage = polygon([
    [2.25, 3.5],
    [6.5, 3.5],
    [6.5, 8.75],
    [2.25, 8.75],
  ]);
  expect(coverage[3 * 20 + 2]).toBeCloseTo(0.75 * 0.5, 6);
  expect(coverage[5 * 20 + 4]).toBeCloseTo(1, 6);
  expect(coverage[8 * 20 + 6]).toBeCloseTo(0.5 * 0.75, 6);
  expect(coverage[5 * 20 + 7]).toBeCloseTo(0, 6);
});

test("a triangle's coverage adds up to its area (the shoelace formula), whichever way round", () => {
  const corner = fc.tuple(fc.double({ min: 0, max: 19, noNaN: true }), fc.double({ min: 0, max: 19, noNaN: true }));
  fc.assert(
    fc.property(corner, corner, corner, (a, b, c) => {
      const shoelace = Math.abs((b[0] - a[0]) * (c[1] - a[1]) - (c[0] - a[0]) * (b[1] - a[1])) / 2;
      for (const corners of [
        [a, b, c],
        [c, b, a],
      ]) {
        const total = polygon(corners).reduce((sum, amount) => sum + amount, 0);
        expect(Math.abs(total - shoelace)).toBeLessThan(1e-3);
      }
    }),
  );
});
