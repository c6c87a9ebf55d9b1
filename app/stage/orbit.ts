import type { Orbit } from "./camera.ts";

const STEEPEST = 89;
const NEAREST = 0.2;
const FARTHEST = 10;

/** Turns the visitor's eye around the cast; angles in degrees. Azimuth stays in (-180, 180], elevation off the poles. */
export function turned(orbit: Orbit, azimuthDeg: number, elevationDeg: number): Orbit {
  const azimuth = (((orbit.azimuthDeg + azimuthDeg) % 360) + 540) % 360;
  const elevation = orbit.elevationDeg + elevationDeg;
  return {
    ...orbit,
    azimuthDeg: azimuth - 180,
    elevationDeg: Math.min(Math.max(elevation, -STEEPEST), STEEPEST),
  };
}

/** Goes nearer (factor below 1) or farther, no closer and no farther than a scene document allows. */
export function moved(orbit: Orbit, factor: number): Orbit {
  return { ...orbit, distance: Math.min(Math.max(orbit.distance * factor, NEAREST), FARTHEST) };
}

/** What a key does to the view, or null when it is not the stage's: arrows turn, + and - go nearer and farther. */
export function orbitKey(orbit: Orbit, key: string): Orbit | null {
  if (key === "ArrowLeft") return turned(orbit, -TURN_DEG, 0);
  if (key === "ArrowRight") return turned(orbit, TURN_DEG, 0);
  if (key === "ArrowUp") return turned(orbit, 0, TURN_DEG);
  if (key === "ArrowDown") return turned(orbit, 0, -TURN_DEG);
  if (key === "+" || key === "=") return moved(orbit, 1 / STEP);
  if (key === "-" || key === "_") return moved(orbit, STEP);
  return null;
}

/** One press of a key or a button. */
export const TURN_DEG = 10;
export const STEP = 1.2;
