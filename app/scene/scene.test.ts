import fc from "fast-check";
import { expect, test } from "vitest";
import { claimsOf, claimsSentence } from "./claims.ts";
import { uncertainOrder } from "./depth-order.ts";
import { SceneDocument } from "./document.ts";
import { layoutVolume, type SceneMember } from "./layout.ts";
import { distanceAt, radiusOf, scaleFor } from "./radial-scale.ts";
import { decadeLengths, evenLengths, roundLengthBelow } from "./round-lengths.ts";

const volume = (more: object = {}) => SceneDocument.parse({ kind: "volume", ...more });
const member = (name: string, value: number, spread: number, more: Partial<SceneMember> = {}): SceneMember => ({
  recordId: name,
  name,
  raDeg: 200,
  decDeg: 50,
  distancePc: { value, low: value - spread, high: value + spread },
  regime: "firm",
  bv: 0.1,
  vMag: 2,
  labelled: true,
  ...more,
});
const length = ([x, y, z]: number[]) => Math.hypot(x ?? 0, y ?? 0, z ?? 0);

test("a document has defaults, and refuses what it does not know", () => {
  expect(volume()).toMatchObject({ version: 1, mapping: "linear", rings: "auto", camera: { distance: 1 } });
  expect(SceneDocument.safeParse({ kind: "volume", glow: true }).success).toBe(false);
  expect(SceneDocument.safeParse({ kind: "tunnel" }).success).toBe(false);
  expect(SceneDocument.safeParse({ kind: "volume", camera: { elevationDeg: 90 } }).success).toBe(false);
});

test("only a linear scene claims positions to scale, and none claims sizes", () => {
  expect(claimsOf(volume())).toEqual({ positions: "to-scale", sizes: "not-to-scale" });
  expect(claimsOf(volume({ mapping: "log" }))).toEqual({ positions: "not-to-scale", sizes: "not-to-scale" });
  expect(claimsSentence(claimsOf(volume()), "fr")).toBe("Positions à l’échelle, tailles non.");
});

test("a linear scene keeps every ratio of distances", () => {
  const { stars } = layoutVolume(volume(), [member("A", 10, 1), member("B", 25, 1, { raDeg: 10 })]);
  const [a, b] = stars.map((star) => length(star.position));
  expect((b ?? 0) / (a ?? 1)).toBeCloseTo(2.5, 12);
});

test("error bars lie on the line of sight, the star between their ends", () => {
  for (const mapping of ["linear", "log"] as const) {
    const [star] = layoutVolume(volume({ mapping }), [member("A", 10, 2)]).stars;
    const [low, at, high] = [star?.low ?? [], star?.position ?? [], star?.high ?? []].map(length);
    expect(low).toBeLessThan(at ?? 0);
    expect(at).toBeLessThan(high ?? 0);
    const dot = (star?.low ?? []).reduce((sum, x, axis) => sum + x * (star?.high[axis] ?? 0), 0);
    expect(dot / ((low ?? 1) * (high ?? 1))).toBeCloseTo(1, 12);
  }
});

test("a range that is open to infinity is drawn to a finite length", () => {
  const open = member("A", 10, 1, { distancePc: { value: 10, low: 5, high: 30 }, regime: "prior-led" });
  expect(layoutVolume(volume(), [open]).stars[0]?.high.every(Number.isFinite)).toBe(true);
});

test("only a linear scene has a scale bar, and it is a round length", () => {
  const cast = [member("A", 30, 1)];
  expect(layoutVolume(volume(), cast).scaleBar?.label.replace("\u00a0", " ")).toBe("20 light-years");
  expect(layoutVolume(volume({ mapping: "log" }), cast).scaleBar).toBeNull();
});

test("an unlabelled member has no label, but is in its place", () => {
  const [star] = layoutVolume(volume(), [member("A", 10, 1, { labelled: false })]).stars;
  expect(star?.label).toBe("");
  expect(star?.name).toBe("A");
});

test("neighbours whose ranges overlap are named", () => {
  expect(uncertainOrder([member("C", 30, 1), member("A", 10, 1), member("B", 11, 1)])).toEqual([["A", "B"]]);
  expect(uncertainOrder([member("A", 10, 0.1), member("B", 11, 0.1)])).toEqual([]);
});

test("an empty cast has a layout", () => {
  const layout = layoutVolume(volume(), []);
  expect(layout.stars).toEqual([]);
  expect(Number.isFinite(layout.extent)).toBe(true);
});

test("the radial scale grows with distance and can be undone", () => {
  const distance = fc.double({ min: 0, max: 1e6, noNaN: true });
  fc.assert(
    fc.property(distance, distance, fc.constantFrom("linear" as const, "log" as const), (a, b, mapping) => {
      const scale = scaleFor(mapping, [1.3, 600]);
      expect(Math.abs(distanceAt(scale, radiusOf(scale, a)) - a)).toBeLessThanOrEqual(1e-9 * Math.max(a, 1e-3));
      if (a < b * (1 - 1e-9)) expect(radiusOf(scale, a)).toBeLessThan(radiusOf(scale, b));
    }),
  );
  expect(radiusOf(scaleFor("log", [1.3]), 0)).toBe(0);
});

test("round lengths are 1, 2 or 5 times a power of ten", () => {
  expect([0.3, 1, 1.9, 2, 49, 50, 7e5].map(roundLengthBelow)).toEqual([0.2, 1, 1, 2, 20, 50, 500000]);
  expect(evenLengths(0.9)).toEqual([0.2, 0.4, 0.6, 0.8]);
  expect(evenLengths(103)).toEqual([50, 100]);
  expect(decadeLengths(4, 900)).toEqual([10, 100]);
  expect(decadeLengths(4, 30)).toEqual([5, 10, 20]);
});
