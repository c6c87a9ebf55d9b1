import { Scene, Vector3 } from "three";
import { expect, test } from "vitest";
import { convertLength } from "#app/astrometry/units.ts";
import { claimsSentence } from "#app/scene/claims.ts";
import { SceneDocument } from "#app/scene/document.ts";
import { layoutVolume } from "#app/scene/layout.ts";
import { cameraFor } from "./camera.ts";
import { pixelsPerUnitAtSun, putScaleBar } from "./scale-bar.ts";

const members = [
  {
    recordId: "a",
    name: "Alkaid",
    raDeg: 206.885,
    decDeg: 49.313,
    distancePc: { value: 31.87, low: 31.63, high: 32.11 },
    regime: "firm" as const,
    bv: null,
    vMag: null,
    labelled: true,
  },
];

function barOf(camera: { distance: number }, mapping: "linear" | "log" = "linear") {
  const document = SceneDocument.parse({ kind: "volume", mapping });
  const layout = layoutVolume(document, members);
  const view = { document, layout, language: "en" as const, camera: cameraFor(document, layout, 16 / 9, camera) };
  const scene = new Scene();
  for (const _ of [1, 2]) putScaleBar(scene, { ...view, heightPx: 720 });
  const group = scene.getObjectByName("scale-bar")!;
  const texts: string[] = [];
  let lengthPx: number | null = null;
  group.traverse((object) => {
    if (object.userData.label) texts.push(object.userData.label.text);
    const line = object as unknown as { geometry?: { getAttribute(name: string): { getX(at: number): number } } };
    const position = line.geometry?.getAttribute("position");
    if (position) lengthPx = position.getX(1) - position.getX(0);
  });
  return { ...view, scene, texts, lengthPx };
}

test("the bar is as long as its words say where the Sun stands", () => {
  const { camera, texts, lengthPx } = barOf({ distance: 1 });
  const lightYears = Number(/^(\d+)\u00a0light-years where the Sun stands$/.exec(texts[0] ?? "")?.[1]);
  const length = convertLength(lightYears, "ly", "pc");
  // Beside the Sun, at the Sun's depth, measured through three's own projection.
  const right = new Vector3(1, 0, 0).applyQuaternion(camera.quaternion).multiplyScalar(length);
  const measured = ((right.project(camera).x - new Vector3().project(camera).x) / 2) * 720 * (16 / 9);
  expect(lengthPx).toBeCloseTo(measured, 6);
});

test("nearer to the cast the bar stands for less and still fits", () => {
  const [near, far] = [barOf({ distance: 0.6 }), barOf({ distance: 8 })];
  expect(near.texts[0]).not.toBe(far.texts[0]);
  for (const { lengthPx } of [near, far]) expect(lengthPx! > 60 && lengthPx! <= 220).toBe(true);
});

test("a scene that is not to scale has no bar and says so", () => {
  const { texts, lengthPx, layout } = barOf({ distance: 1 }, "log");
  expect(lengthPx).toBeNull();
  expect(texts).toEqual([layout.stretchText, claimsSentence(layout.claims, "en")]);
  expect(texts.join(" ")).toMatch(/stretched.*neither positions nor sizes to scale/i);
});

test("a new bar takes the old one's place", () => {
  expect(barOf({ distance: 1 }).scene.children.length).toBe(1);
});

test("with the Sun behind the eye there is no length to tell", () => {
  const { camera } = barOf({ distance: 1 });
  camera.lookAt(camera.position.clone().multiplyScalar(2));
  camera.updateMatrixWorld();
  expect(pixelsPerUnitAtSun(camera, 720)).toBeNull();
});
