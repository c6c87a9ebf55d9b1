import { expect, test } from "vitest";
import { fitDomain, logPlace, spreadGeometry } from "./spread-geometry.ts";

// Expected places are worked by hand from the definition of a logarithmic axis: equal ratios are equal lengths.

test("a decade axis puts equal ratios at equal lengths", () => {
  const place = logPlace([1, 100]);
  expect(place(1)).toBe(0);
  expect(place(10)).toBeCloseTo(50, 3);
  expect(place(100)).toBeCloseTo(100, 3);
});

test("value and both ranges are placed on one axis", () => {
  const bar = spreadGeometry(
    { value: 10, low: 10 ** 0.8, high: 10 ** 1.2, low90: 10 ** 0.6, high90: 10 ** 1.4 },
    [1, 100],
  );
  expect(bar.value).toBeCloseTo(50, 3);
  expect(bar.band68!.start).toBeCloseTo(40, 3);
  expect(bar.band68!.width).toBeCloseTo(20, 3);
  expect(bar.band90!.start).toBeCloseTo(30, 3);
  expect(bar.band90!.width).toBeCloseTo(40, 3);
  expect(bar.band68!.openStart || bar.band68!.openEnd).toBe(false);
});

test("a range without an upper end runs to the edge and says that it is open", () => {
  const bar = spreadGeometry({ value: null, low: 10, high: Number.POSITIVE_INFINITY }, [1, 100]);
  expect(bar.value).toBeNull();
  expect(bar.band68!.start).toBeCloseTo(50, 3);
  expect(bar.band68!.width).toBeCloseTo(50, 3);
  expect(bar.band68!.openEnd).toBe(true);
});

test("a low end at or below zero is open on the left", () => {
  const bar = spreadGeometry({ low: -3, high: 10 }, [1, 100]);
  expect(bar.band68).toMatchObject({ start: 0, openStart: true, openEnd: false });
  expect(bar.band68!.width).toBeCloseTo(50, 3);
});

test("what lies wholly outside the axis is not drawn", () => {
  expect(spreadGeometry({ value: 500, low: 400, high: 600 }, [1, 100])).toEqual({
    value: null,
    band68: null,
    band90: null,
  });
  expect(spreadGeometry({ value: 0.5, low: 0.4, high: 0.6 }, [1, 100]).band68).toBeNull();
});

test("an impossible axis or range is refused", () => {
  expect(() => spreadGeometry({ low: 1, high: 2 }, [0, 10])).toThrow(RangeError);
  expect(() => spreadGeometry({ low: 1, high: 2 }, [10, 10])).toThrow(RangeError);
  expect(() => spreadGeometry({ low: 1, high: 2 }, [1, Number.POSITIVE_INFINITY])).toThrow(RangeError);
  expect(() => spreadGeometry({ low: 3, high: 2 }, [1, 10])).toThrow(RangeError);
  expect(() => spreadGeometry({ low: Number.NaN, high: 2 }, [1, 10])).toThrow(RangeError);
});

test("a fitted axis leaves the same room on both sides", () => {
  const spread = { value: 10, low: 8, high: 12.5, low90: 5, high90: 20 };
  const bar = spreadGeometry(spread, fitDomain([spread], 0.5));
  expect(bar.band90!.start).toBeCloseTo(25, 2);
  expect(bar.band90!.width).toBeCloseTo(50, 2);
  expect(bar.value).toBeCloseTo(50, 2);
});

test("a fitted axis ignores ends that a log axis cannot hold, and refuses when none is left", () => {
  const [min, max] = fitDomain([{ low: -1, high: Number.POSITIVE_INFINITY, value: 40 }], 0);
  expect(Math.sqrt(min * max)).toBeCloseTo(40, 9);
  expect(max / min).toBeCloseTo(Math.exp(0.02), 9);
  expect(() => fitDomain([{ low: -2, high: -1 }])).toThrow(RangeError);
});
