import { PerspectiveCamera, Vector3 } from "three";
import type { SceneDocument } from "#app/scene/document.ts";
import type { VolumeLayout } from "#app/scene/layout.ts";

/** Where the eye stands around the cast. Angles in degrees; distance 1 just fits the cast. */
export interface Orbit {
  azimuthDeg: number;
  elevationDeg: number;
  distance: number;
}

/** Room left around the cast, for names and the bar. */
const ROOM = 1.12;
const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** The middle and the radius of the cast and the Sun together, scene units. */
export function sphereOf(layout: VolumeLayout): { centre: Vector3; radius: number } {
  const places = [new Vector3(), ...layout.stars.map(({ position }) => new Vector3(...position))];
  const low = places.reduce((least, place) => least.clone().min(place));
  const high = places.reduce((most, place) => most.clone().max(place));
  const centre = low.add(high).multiplyScalar(0.5);
  const radius = Math.max(...places.map((place) => place.distanceTo(centre)));
  return { centre, radius: radius > 0 ? radius : 1 };
}

/**
 * The camera of a scene: around the middle of the cast and the Sun, Galactic north up. Azimuth 0 looks along -x, away
 * from the Galactic centre.
 * @param aspect width over height of the picture
 * @param override where the visitor has turned to; what is left out is the document's
 */
export function cameraFor(
  document: SceneDocument,
  layout: VolumeLayout,
  aspect: number,
  override: Partial<Orbit> = {},
): PerspectiveCamera {
  const { azimuthDeg, elevationDeg, distance, fovDeg } = { ...document.camera, ...override };
  const { centre, radius } = sphereOf(layout);
  const halfHeight = radians(fovDeg) / 2;
  const halfWidth = Math.atan(Math.tan(halfHeight) * aspect);
  const away = ((radius * ROOM) / Math.sin(Math.min(halfHeight, halfWidth))) * distance;
  const camera = new PerspectiveCamera(fovDeg, aspect, away / 1000, (away + radius) * 100);
  const [azimuth, elevation] = [radians(azimuthDeg), radians(elevationDeg)];
  camera.up.set(0, 0, 1);
  camera.position
    .set(Math.cos(elevation) * Math.cos(azimuth), Math.cos(elevation) * Math.sin(azimuth), Math.sin(elevation))
    .multiplyScalar(away)
    .add(centre);
  camera.lookAt(centre);
  camera.updateProjectionMatrix();
  camera.updateMatrixWorld();
  return camera;
}
