import fc from "fast-check";
import { expect, test } from "vitest";
import { binByTile } from "./bin.ts";

const surface = { width: 300, height: 100, tilesAcross: 5 };
const star = fc.record({
  x: fc.double({ min: -20, max: 320, noNaN: true }),
  y: fc.double({ min: -20, max: 120, noNaN: true }),
  seen: fc.boolean(),
});

test("every star in view comes once, those of one tile together and in their order", () => {
  fc.assert(
    fc.property(fc.array(star, { maxLength: 200 }), (stars) => {
      const places = Float64Array.from(stars.flatMap(({ x, y, seen }) => [x, y, seen ? 1 : Number.NaN]));
      const sorted = [...binByTile(places, surface)];
      const tileOf = (at: number) => {
        const column = Math.min(Math.max(Math.floor(places[at * 3]! / 64), 0), 4);
        return Math.min(Math.max(Math.floor(places[at * 3 + 1]! / 32), 0), 3) * 5 + column;
      };
      const expected = stars
        .flatMap(({ seen }, at) => (seen ? [at] : []))
        .sort((a, b) => tileOf(a) - tileOf(b) || a - b);
      expect(sorted).toEqual(expected);
    }),
  );
});

test("a star far outside the frame is left out, one whose light may still reach it is not", () => {
  expect([...binByTile(Float64Array.of(-100, 50, 1, 5000, 50, 1), surface)]).toEqual([0]);
});
