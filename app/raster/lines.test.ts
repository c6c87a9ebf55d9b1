import fc from "fast-check";
import { PerspectiveCamera } from "three";
import { expect, test } from "vitest";
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

test("a line at any angle covers its length times its width to 3 %", () => {
  fc.assert(
    fc.property(
      fc.double({ min: 0, max: 2 * Math.PI, noNaN: true }),
      fc.double({ min: 0.5, max: 4, noNaN: true }),
      fc.double({ min: 40, max: 55, noNaN: true }),
      (angle, width, length) => {
        const mask = createMask(128, 128);
        coverLine(mask, 64, 64, 64 + Math.cos(angle) * length, 64 + Math.sin(angle) * length, width);
        expect(area(mask) / (length * width)).toBeGreaterThan(0.97);
        expect(area(mask) / (length * width)).toBeLessThan(1.03);
      },
    ),
  );
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
