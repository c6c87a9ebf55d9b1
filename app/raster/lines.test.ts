import fc from "fast-check";
import { PerspectiveCamera } from "three";
import { expect, test } from "vitest";
import { addEdge, coverageOf, createArea } from "./area.ts";
import { coverLine, coverSegment } from "./lines.ts";
import { createMask } from "./mask.ts";
import { projectorOf } from "./project.ts";

const area = (mask: { coverage: Float32Array }) => mask.coverage.reduce((total, amount) => total + amount, 0);

test("a level line covers exactly its own area", () => {
  const mask = createMask(64, 64);
  coverLine(mask, 10.25, 20.5, 40.75, 20.5, 1.5);
  expect(area(mask)).toBeCloseTo(30.5 * 1.5, 5);
  expect(mask.coverage[20 * 64 + 20]).toBeCloseTo(1, 6);
  expect(mask.coverage[19 * 64 + 20]).toBeCloseTo(0.25, 6);
});

// The oracle is the letters' rasteriser: a running sum of signed areas, which shares no arithmetic with the lines.
test("a line at any angle covers each pixel by exactly the area of its rectangle in it", () => {
  fc.assert(
    fc.property(
      fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }),
      fc.double({ min: 0.2, max: 6, noNaN: true }),
      fc.double({ min: 0.1, max: 40, noNaN: true }),
      fc.double({ min: 47, max: 49, noNaN: true }),
      (angle, width, length, start) => {
        const mask = createMask(96, 96);
        const [ux, uy] = [Math.cos(angle), Math.sin(angle)];
        coverLine(mask, start, start, start + ux * length, start + uy * length, width);
        const corner = (along: number, side: number) =>
          [start + ux * along - (uy * side * width) / 2, start + uy * along + (ux * side * width) / 2] as const;
        const corners = [corner(0, -1), corner(length, -1), corner(length, 1), corner(0, 1)];
        const exact = createArea(96, 96);
        for (const [at, [x, y]] of corners.entries()) addEdge(exact, x, y, ...corners[(at + 1) % 4]!);
        const difference = coverageOf(exact).map((amount, at) => Math.abs(amount - mask.coverage[at]!));
        // Both keep coverage as 32-bit floats; the running sum of the oracle loses a few of their last places.
        expect(Math.max(...difference)).toBeLessThan(2e-5);
        expect(area(mask)).toBeCloseTo(length * width, 3);
      },
    ),
  );
});

test("a line that runs far out of the frame covers its part inside to the very edge", () => {
  const mask = createMask(40, 40);
  coverLine(mask, -1e6, 20.5 - 1e6, 1e6, 20.5 + 1e6, 2);
  const inside = (x: number, y: number) => mask.coverage[y * 40 + x]!;
  for (const x of [0, 10, 19]) expect(inside(x, x + 20)).toBeCloseTo(inside(5, 25), 6);
  expect(inside(5, 25)).toBeCloseTo(1, 1);
});

test("a line that passes through the camera is cut at the near plane and keeps its direction", () => {
  const camera = new PerspectiveCamera(90, 1, 0.1, 100);
  camera.updateMatrixWorld();
  const projector = projectorOf(camera, 100, 100);
  const mask = createMask(100, 100);
  coverSegment(mask, projector, [0.05, 0, 5], [0.05, 0, -50], 1);
  const covered = Array.from(mask.pixels.subarray(0, mask.count), (at) => [at % 100, Math.floor(at / 100)] as const);
  expect(covered.length).toBeGreaterThan(10);
  expect(covered.every(([x, y]) => x >= 48 && x <= 76 && (y === 49 || y === 50))).toBe(true);
});

test("a line wholly behind the camera, or wholly outside the frame, covers nothing", () => {
  const camera = new PerspectiveCamera(90, 1, 0.1, 100);
  camera.updateMatrixWorld();
  const mask = createMask(100, 100);
  coverSegment(mask, projectorOf(camera, 100, 100), [0, 0, 1], [1, 1, 2], 2);
  coverLine(mask, -50, -10, 300, -20, 2);
  expect(mask.count).toBe(0);
});
