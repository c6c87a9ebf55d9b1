import type { KeyboardEvent } from "react";
import { expect, test } from "vitest";
import type { Orbit } from "./camera.ts";
import { stageKeys } from "./stage-keys.ts";

const start: Orbit = { azimuthDeg: 0, elevationDeg: 20, distance: 1 };

function stage(selected: string | null = null) {
  const seen = { orbit: start, selected, resets: 0 };
  const onKeyDown = stageKeys({
    orbit: start,
    changeOrbit: (change) => {
      seen.orbit = change(seen.orbit);
    },
    reset: () => {
      seen.resets += 1;
    },
    recordIds: ["a", "b", "c"],
    selectedId: selected,
    select: (recordId) => {
      seen.selected = recordId;
    },
    middleStar: () => "b",
  });
  const press = (key: string, held: object = {}) => {
    let kept = false;
    const preventDefault = () => {
      kept = true;
    };
    onKeyDown({ key, preventDefault, currentTarget: {}, ...held } as unknown as KeyboardEvent<HTMLElement>);
    return kept;
  };
  return { seen, press };
}

test("arrows turn, plus and minus go nearer and farther", () => {
  const { seen, press } = stage();
  for (const key of ["ArrowRight", "ArrowUp", "+", "+", "-"]) expect(press(key), key).toBe(true);
  expect(seen.orbit.azimuthDeg).toBeGreaterThan(0);
  expect(seen.orbit.elevationDeg).toBeGreaterThan(20);
  expect(seen.orbit.distance).toBeCloseTo(1 / 1.2, 12);
});

test.each([
  ["n", null, "a"],
  ["N", "c", "a"],
  ["p", "a", "c"],
  ["Enter", null, "b"],
  ["Escape", "a", null],
])("%s with %s chosen chooses %s", (key, before, after) => {
  const { seen, press } = stage(before);
  expect(press(key)).toBe(true);
  expect(seen.selected).toBe(after);
});

test("Home and 0 start again", () => {
  const { seen, press } = stage();
  press("Home");
  press("0");
  expect(seen.resets).toBe(2);
});

test("what is not the stage's stays the browser's", () => {
  const { seen, press } = stage("a");
  for (const key of ["Tab", "x", "F5"]) expect(press(key), key).toBe(false);
  for (const held of ["ctrlKey", "metaKey", "altKey"]) expect(press("ArrowLeft", { [held]: true }), held).toBe(false);
  expect(stage().press("Escape")).toBe(false);
  expect(seen).toEqual({ orbit: start, selected: "a", resets: 0 });
});
