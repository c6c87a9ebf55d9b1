import fc from "fast-check";
import { expect, test } from "vitest";
import { byteFromLinear, resolveFrame } from "./resolve.ts";
import { splat } from "./splat.ts";
import { fluxOf } from "./stamps.ts";
import { beginFrame, createSurface } from "./surface.ts";

const sum = (values: Float32Array) => values.reduce((total, value) => total + value, 0);

test("a star gives the same flux wherever in its pixel it stands", () => {
  fc.assert(
    fc.property(
      fc.double({ min: 60, max: 68, noNaN: true }),
      fc.double({ min: 60, max: 68, noNaN: true }),
      fc.integer({ min: 2, max: 20 }),
      (x, y, quarters) => {
        const surface = createSurface(128, 128, [0, 0, 0]);
        splat(surface, x, y, quarters / 4, 1, 0, 0);
        expect(sum(surface.light) / fluxOf(quarters / 4)).toBeCloseTo(1, 6);
      },
    ),
    { numRuns: 40 },
  );
});

test("the light's centre follows the star to an eighth of a pixel", () => {
  for (const x of [60.05, 60.3, 60.55, 60.8, 61]) {
    const surface = createSurface(128, 128, [0, 0, 0]);
    splat(surface, x, 64, 3, 1, 1, 1);
    const { light, width } = surface;
    let moment = 0;
    for (let pixel = 0; pixel < light.length / 3; pixel++) moment += light[pixel * 3]! * ((pixel % width) + 0.5);
    expect(Math.abs(moment / (sum(light) / 3) - x)).toBeLessThanOrEqual(0.13);
  }
});

test("two stars at one place give twice the linear light of one, not twice the sRGB value", () => {
  const light = (times: number) => {
    const surface = createSurface(96, 96, [0, 0, 0]);
    for (let time = 0; time < times; time++) splat(surface, 48, 48, 4, 0.05, 0.05, 0.05);
    resolveFrame(surface);
    const at = 48 * 96 + 48;
    return { linear: surface.light[at * 3]!, byte: surface.bytes[at * 4]! };
  };
  const [one, two] = [light(1), light(2)];
  expect(two.linear).toBeCloseTo(2 * one.linear, 6);
  expect(two.byte).toBe(byteFromLinear(2 * one.linear));
  expect(two.byte).toBeLessThan(1.6 * one.byte);
});

test("a frame drawn over an earlier one keeps nothing of it", () => {
  const surface = createSurface(200, 100, [0.01, 0.02, 0.03]);
  resolveFrame(surface);
  const empty = surface.bytes.slice();
  beginFrame(surface);
  splat(surface, 150, 50, 5, 1, 1, 1);
  resolveFrame(surface);
  expect(surface.bytes).not.toEqual(empty);
  beginFrame(surface);
  resolveFrame(surface);
  expect(surface.bytes).toEqual(empty);
});
