import fc from "fast-check";
import { expect, test } from "vitest";
import { claimsOf, claimsSentence, stretchText } from "./claims.ts";
import { uncertainOrder } from "./depth-order.ts";
import { SceneDocument } from "./document.ts";
import { type CastMember, layoutVolume, type SceneMember } from "./layout.ts";
import { distanceAt, radiusOf, scaleFor } from "./radial-scale.ts";
import { evenLengths, roundLengthBelow, stretchedLengths } from "./round-lengths.ts";

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
  expect(SceneDocument.safeParse({ kind: "volume", version: 2 }).success).toBe(false);
  expect(SceneDocument.safeParse({ kind: "volume", camera: { elevationDeg: 90 } }).success).toBe(false);
  expect(SceneDocument.safeParse({ kind: "volume", camera: { roll: 1 } }).success).toBe(false);
});

test("a form's text is read as a number; what is empty or no number is refused at its field", () => {
  expect(volume({ camera: { azimuthDeg: " -12.5 " } }).camera.azimuthDeg).toBe(-12.5);
  for (const wrong of ["", "  ", "abc", "Infinity", null, true]) {
    const refused = SceneDocument.safeParse({ kind: "volume", camera: { azimuthDeg: wrong } });
    expect(refused.error?.issues[0]?.path, String(wrong)).toEqual(["camera", "azimuthDeg"]);
  }
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

test("who has no place is missing with the reason, and nobody is dropped", () => {
  const cast: CastMember[] = [
    member("A", 10, 1),
    { ...member("B", 10, 1), raDeg: null },
    { ...member("C", 10, 1), regime: "prior-led", distancePc: null },
    { ...member("D", 10, 1), regime: null, distancePc: null },
    { ...member("E", 10, 1), distancePc: { value: 10, low: 5, high: Number.POSITIVE_INFINITY } },
    member("F", 10, 9, { regime: "prior-led" }),
  ];
  const { stars, missing } = layoutVolume(volume(), cast);
  expect(stars.map(({ name }) => name)).toEqual(["A", "F"]);
  expect(missing.map(({ name, reason }) => `${name}: ${reason}`)).toEqual([
    "B: Its position on the sky is not known.",
    "C: Its parallax alone gives no distance: a prior must be chosen, with a reason.",
    "D: No distance has been adopted.",
    "E: Its distance has no usable range.",
  ]);
});

test("a lopsided range is drawn to its true end", () => {
  const wide = member("A", 10, 1, { distancePc: { value: 10, low: 5, high: 90 }, regime: "prior-led" });
  expect(length(layoutVolume(volume(), [wide]).stars[0]?.high ?? [])).toBeCloseTo(90, 9);
});

test("a star is where it is seen: Galactic Cartesian, as ERFA's icrs2g gives it", () => {
  // METHODS: RA 269.45207696, Dec 4.69336497, 1000/548.31 pc.
  const pc = 1000 / 548.31;
  const star = member("A", pc, 0.01, { raDeg: 269.45207696, decDeg: 4.69336497 });
  const [x, y, z] = layoutVolume(volume(), [star]).stars[0]?.position ?? [];
  expect(x).toBeCloseTo(1.51630039, 8);
  expect(y).toBeCloseTo(0.91139848, 8);
  expect(z).toBeCloseTo(0.44314853, 8);
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

test("pairs whose ranges overlap are named", () => {
  expect(uncertainOrder([member("C", 30, 1), member("A", 10, 1), member("B", 11, 1)])).toEqual([["A", "B"]]);
  expect(uncertainOrder([member("A", 10, 0.1), member("B", 11, 0.1)])).toEqual([]);
});

test("a wide range leaves the order open beyond the next neighbour", () => {
  const cast = [member("A", 10, 5), member("B", 11, 0.1), member("C", 12, 0.1)];
  const open = [
    ["A", "B"],
    ["A", "C"],
  ];
  expect(uncertainOrder(cast)).toEqual(open);
  expect(layoutVolume(volume(), cast).claims.uncertainOrder).toEqual(open);
});

test("exactly the pairs that overlap are named, whatever the order of the cast", () => {
  const spans = fc.array(fc.tuple(fc.double({ min: 10, max: 20, noNaN: true }), fc.double({ min: 0.1, max: 5 })), {
    maxLength: 12,
  });
  fc.assert(
    fc.property(spans, (cast) => {
      const members = cast.map(([value, spread], at) => member(`${at}`, value, spread || 1));
      const found = uncertainOrder(members).map(([a, b]) => [a, b].sort().join());
      const expected = members.flatMap((a, at) =>
        members
          .slice(at + 1)
          .filter((b) => a.distancePc.low < b.distancePc.high && b.distancePc.low < a.distancePc.high)
          .map((b) => [a.name, b.name].sort().join()),
      );
      expect(found.sort()).toEqual(expected.sort());
    }),
  );
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
});

test("rings of a log scene are each as many times farther as the scene says", () => {
  expect(stretchedLengths(4, 900)).toEqual({ lengths: [10, 100], ratio: 10 });
  expect(stretchedLengths(4, 30)).toEqual({ lengths: [5, 10, 20], ratio: 2 });
  expect(stretchedLengths(79.7, 123)).toEqual({ lengths: [25, 50, 100], ratio: 2 });
  expect(() => stretchedLengths(0, 5)).toThrow(RangeError);
  const distance = fc.double({ min: 1e-4, max: 1e9, noNaN: true });
  fc.assert(
    fc.property(distance, distance, (a, b) => {
      const { lengths, ratio } = stretchedLengths(Math.min(a, b), Math.max(a, b));
      expect(lengths.length).toBeGreaterThanOrEqual(2);
      expect(lengths.at(-1)).toBeLessThanOrEqual(Math.max(a, b) * 1.1000001);
      for (const [at, length] of lengths.slice(1).entries()) expect(length / (lengths[at] ?? 0)).toBeCloseTo(ratio, 9);
    }),
  );
});

test("a log scene says how it stretches, a linear one does not", () => {
  const cast = [member("A", 2, 0.1), member("B", 300, 1)];
  const log = volume({ mapping: "log" });
  expect(layoutVolume(log, cast).stretchText).toBe("Distances stretched: each ring is 10 times farther");
  expect(layoutVolume(volume({ mapping: "log", rings: "none" }), cast).stretchText).toBe(stretchText(null, "en"));
  expect(layoutVolume(log, cast, "fr").stretchText).toContain("10 fois plus loin");
  expect(layoutVolume(volume(), cast).stretchText).toBeNull();
});
