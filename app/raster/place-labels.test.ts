import fc from "fast-check";
import { expect, test } from "vitest";
import { overlaps, placeLabels } from "./place-labels.ts";

const frame = { width: 400, height: 300 };
const length = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const rectangle = fc
  .record({ left: length(0, 350), top: length(0, 250), width: length(1, 80), height: length(1, 60) })
  .map(({ left, top, width, height }) => ({ left, top, right: left + width, bottom: top + height }));
const request = fc.record({
  x: length(-20, 420),
  y: length(-20, 320),
  width: length(5, 120),
  height: length(5, 40),
  offset: length(0, 20),
  priority: fc.integer({ min: 0, max: 5 }),
});
const withReduced = fc.tuple(request, fc.boolean()).map(([whole, has]) => ({
  ...whole,
  reduced: has ? { width: whole.width / 2, height: whole.height / 2 } : undefined,
}));

test("placed labels never overlap, keep out of what they must, and lie inside the frame", () => {
  fc.assert(
    fc.property(
      fc.array(withReduced, { maxLength: 30 }),
      fc.array(rectangle, { maxLength: 4 }),
      (requests, keepOut) => {
        const places = placeLabels(requests, frame, keepOut);
        for (const [index, place] of places.entries()) {
          expect([...keepOut, ...places.slice(0, index)].some((other) => overlaps(place, other))).toBe(false);
          expect(place.left >= 0 && place.top >= 0 && place.right <= 400 && place.bottom <= 300).toBe(true);
        }
      },
    ),
  );
});

test("a lone label goes below right of its point, and above where the frame ends", () => {
  const label = { x: 100, y: 100, width: 50, height: 20, offset: 8, priority: 0 };
  expect(placeLabels([label], frame)[0]).toMatchObject({ left: 106, top: 106 });
  expect(placeLabels([{ ...label, y: 295 }], frame)[0]?.bottom).toBeLessThan(295);
});

test("of two labels for one room, the more important has it", () => {
  const label = { x: 100, y: 100, width: 390, height: 290, offset: 0, priority: 0 };
  const centred = { ...label, x: 5, y: 5 };
  const places = placeLabels([centred, { ...centred, priority: 9 }], frame);
  expect(places.map(({ request }) => request.priority)).toEqual([9]);
});

test("no label is nearer to another's point than to its own", () => {
  const label = { width: 60, height: 20, offset: 12, priority: 0 };
  const requests = [
    { ...label, x: 200, y: 150 },
    { ...label, x: 215, y: 165 },
  ];
  const [first] = placeLabels(requests, frame);
  expect(first?.left === 209 && first.top === 159).toBe(false);
});

test("a label without room for both its lines keeps the first", () => {
  const small = { width: 60, height: 40 };
  const label = { x: 0, y: 0, width: 60, height: 40, offset: 0, priority: 0, reduced: { width: 60, height: 20 } };
  expect(placeLabels([label], small)[0]).toMatchObject({ isReduced: false });
  expect(placeLabels([label], { width: 60, height: 25 })[0]).toMatchObject({ isReduced: true, bottom: 20 });
});
