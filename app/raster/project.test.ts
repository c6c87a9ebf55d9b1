import fc from "fast-check";
import { OrthographicCamera, PerspectiveCamera, Vector3 } from "three";
import { expect, test } from "vitest";
import { project, projectorOf } from "./project.ts";

const PARSEC_AU = 206264.806;

// The oracle: textbook pinhole arithmetic in exact integers scaled from doubles would be overkill; instead the place is
// chosen in the camera's own frame, so that the exact pixel is known before anything is computed.
test("a star near the camera stays exact however far both are from the origin", () => {
  fc.assert(
    fc.property(
      fc.double({ min: -0.4, max: 0.4, noNaN: true }),
      fc.double({ min: -0.4, max: 0.4, noNaN: true }),
      fc.double({ min: 1, max: 1e5, noNaN: true }),
      (right, up, depthAu) => {
        const far = 1e5;
        const depth = depthAu / PARSEC_AU;
        const camera = new PerspectiveCamera(40, 16 / 9, 1e-9, 1e9);
        camera.position.set(0, 0, far);
        camera.updateMatrixWorld();
        const [x, y, z] = [right * depth, up * depth, far - depth];
        // The true depth is what the doubles hold, not what was asked for.
        const trueDepth = far - z;
        const out = new Float64Array(3);
        expect(project(projectorOf(camera, 1920, 1080), x, y, z, out)).toBe(true);
        const focal = 540 / Math.tan((20 * Math.PI) / 180);
        expect(Math.abs(out[0]! - (960 + (x / trueDepth) * focal))).toBeLessThan(1e-3);
        expect(Math.abs(out[1]! - (540 - (y / trueDepth) * focal))).toBeLessThan(1e-3);
      },
    ),
  );
});

test("agrees with three's own projection where single steps lose nothing, for both kinds of camera", () => {
  const cameras = [new PerspectiveCamera(50, 1.5, 0.1, 100), new OrthographicCamera(-3, 4, 2, -1, 0.1, 100)];
  for (const camera of cameras) {
    camera.position.set(3, -4, 5);
    camera.up.set(0, 0, 1);
    camera.lookAt(0.3, 0.2, 0.1);
    camera.updateMatrixWorld();
    const out = new Float64Array(3);
    project(projectorOf(camera, 900, 600), 0.5, -0.25, 0.75, out);
    const clip = new Vector3(0.5, -0.25, 0.75).project(camera);
    expect(out[0]).toBeCloseTo((clip.x * 0.5 + 0.5) * 900, 9);
    expect(out[1]).toBeCloseTo((0.5 - clip.y * 0.5) * 600, 9);
  }
});

test("nothing behind the camera, nearer than near or beyond far is projected", () => {
  const camera = new PerspectiveCamera(50, 1, 1, 10);
  camera.updateMatrixWorld();
  const projector = projectorOf(camera, 100, 100);
  const seen = [5, 0, -0.5, -1, -5, -10, -11].map((z) => project(projector, 0, 0, z, new Float64Array(3)));
  expect(seen).toEqual([false, false, false, true, true, true, false]);
});
