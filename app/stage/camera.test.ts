import fc from "fast-check";
import { Vector3 } from "three";
import { expect, test } from "vitest";
import { SceneDocument } from "#app/scene/document.ts";
import { layoutVolume } from "#app/scene/layout.ts";
import { cameraFor } from "./camera.ts";

const document = SceneDocument.parse({ kind: "volume" });
const member = (raDeg: number, decDeg: number, pc: number, name: string) => ({
  recordId: name,
  name,
  raDeg,
  decDeg,
  distancePc: { value: pc, low: pc * 0.99, high: pc * 1.01 },
  regime: "firm" as const,
  bv: null,
  vMag: null,
  labelled: true,
});

const place = fc.record({
  ra: fc.double({ min: 0, max: 359.9, noNaN: true }),
  dec: fc.double({ min: -90, max: 90, noNaN: true }),
  pc: fc.double({ min: 1, max: 5000, noNaN: true }),
});

test("at distance 1 the whole cast and the Sun are in the picture, from every side, in every format", () => {
  fc.assert(
    fc.property(
      fc.array(place, { minLength: 1, maxLength: 12 }),
      fc.double({ min: -180, max: 180, noNaN: true }),
      fc.double({ min: -89, max: 89, noNaN: true }),
      fc.double({ min: 0.4, max: 2.5, noNaN: true }),
      (places, azimuthDeg, elevationDeg, aspect) => {
        const layout = layoutVolume(
          document,
          places.map(({ ra, dec, pc }, at) => member(ra, dec, pc, `star-${at}`)),
        );
        const camera = cameraFor(document, layout, aspect, { azimuthDeg, elevationDeg, distance: 1 });
        for (const position of [[0, 0, 0] as const, ...layout.stars.map((star) => star.position)]) {
          const seen = new Vector3(...position).project(camera);
          expect(Math.max(Math.abs(seen.x), Math.abs(seen.y), Math.abs(seen.z))).toBeLessThanOrEqual(1);
        }
      },
    ),
  );
});

test("azimuth 0 and elevation 0 look along -x with Galactic north up", () => {
  const layout = layoutVolume(document, [member(10, 20, 30, "a")]);
  const camera = cameraFor(document, layout, 1.5, { azimuthDeg: 0, elevationDeg: 0 });
  const ahead = camera.getWorldDirection(new Vector3());
  expect(ahead.x).toBeCloseTo(-1, 9);
  const up = new Vector3(0, 1, 0).applyQuaternion(camera.quaternion);
  expect(up.z).toBeCloseTo(1, 9);
});

test("a cast of nobody still has a camera", () => {
  const camera = cameraFor(document, layoutVolume(document, []), 1.5);
  expect(camera.position.toArray().every(Number.isFinite)).toBe(true);
});
