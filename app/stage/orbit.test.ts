import { expect, test } from "vitest";
import { moved, orbitKey, turned } from "./orbit.ts";
import { stepStar } from "./step-star.ts";

const start = { azimuthDeg: 0, elevationDeg: 0, distance: 1 };

test("turning goes round and stays off the poles", () => {
  expect(turned({ ...start, azimuthDeg: 175 }, 10, 0).azimuthDeg).toBeCloseTo(-175, 9);
  expect(turned(start, -190, 0).azimuthDeg).toBeCloseTo(170, 9);
  expect(turned(start, 0, 500).elevationDeg).toBe(89);
  expect(turned(start, 0, -500).elevationDeg).toBe(-89);
});

test("coming near and going far end where a scene document ends", () => {
  expect(moved(start, 1e-9).distance).toBe(0.2);
  expect(moved(start, 1e9).distance).toBe(10);
});

test("arrows turn, plus and minus undo each other, other keys are left to the page", () => {
  expect(orbitKey(start, "ArrowUp")?.elevationDeg).toBeGreaterThan(0);
  expect(orbitKey(start, "ArrowLeft")?.azimuthDeg).toBeLessThan(0);
  const near = orbitKey(start, "+")!;
  expect(near.distance).toBeLessThan(1);
  expect(orbitKey(near, "-")?.distance).toBeCloseTo(1, 12);
  expect(orbitKey(start, "Tab")).toBeNull();
});

test("stepping through the cast starts at an end and goes round", () => {
  const ids = ["a", "b", "c"];
  expect([null, "a", "c"].map((from) => stepStar(ids, from, 1))).toEqual(["a", "b", "a"]);
  expect([null, "a", "c"].map((from) => stepStar(ids, from, -1))).toEqual(["c", "c", "b"]);
  expect(stepStar([], null, 1)).toBeNull();
});
