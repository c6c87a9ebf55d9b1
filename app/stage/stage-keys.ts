import type { KeyboardEvent } from "react";
import type { Orbit } from "./camera.ts";
import { orbitKey } from "./orbit.ts";
import { stepStar } from "./step-star.ts";
import type { ChangeOrbit } from "./use-pointer-orbit.ts";

interface StageKeys {
  orbit: Orbit;
  changeOrbit: ChangeOrbit;
  reset: () => void;
  recordIds: readonly string[];
  selectedId: string | null;
  select: (recordId: string | null) => void;
  /** The star nearest to the middle of the picture. */
  middleStar: (stage: HTMLElement) => string | null;
}

/** Whether the key was the stage's, after doing what it does. Keys held with alt, control or meta are the browser's. */
function press(keys: StageKeys, key: string, stage: HTMLElement): boolean {
  const { orbit, changeOrbit, reset, recordIds, selectedId, select, middleStar } = keys;
  if (orbitKey(orbit, key)) changeOrbit((now) => orbitKey(now, key) ?? now);
  else if (key === "n") select(stepStar(recordIds, selectedId, 1));
  else if (key === "p") select(stepStar(recordIds, selectedId, -1));
  else if (key === "Enter") select(middleStar(stage) ?? selectedId);
  else if (key === "Escape" && selectedId !== null) select(null);
  else if (key === "Home" || key === "0") reset();
  else return false;
  return true;
}

/** What the keyboard does to a stage that has the focus. */
export function stageKeys(keys: StageKeys) {
  return (event: KeyboardEvent<HTMLElement>) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const key = event.key.length === 1 ? event.key.toLowerCase() : event.key;
    if (press(keys, key, event.currentTarget)) event.preventDefault();
  };
}
