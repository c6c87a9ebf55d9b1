import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import {
  BufferAttribute,
  BufferGeometry,
  Color,
  LineBasicMaterial,
  LineSegments,
  Object3D,
  PerspectiveCamera,
  Points,
  Scene,
} from "three";
import { expect, test } from "vitest";
import { linearFromHex } from "./colour.ts";
import { parseFont } from "./font.ts";
import { renderFrame } from "./frame.ts";
import { pickStar } from "./pick.ts";
import { overlaps } from "./place-labels.ts";
import { project, projectorOf } from "./project.ts";

const face = (file: string) =>
  parseFont(new Uint8Array(readFileSync(createRequire(import.meta.url).resolve(`@fontsource/${file}`))).buffer);
const head = [
  face("space-grotesk/files/space-grotesk-latin-500-normal.woff"),
  face("source-sans-3/files/source-sans-3-greek-400-normal.woff"),
];
const fonts = { head, body: head };
const NIGHT = linearFromHex("#0a0f1c");
const size = { width: 320, height: 200 };

function starsAt(...places: [number, number, number][]) {
  const geometry = new BufferGeometry();
  geometry.setAttribute("position", new BufferAttribute(Float64Array.from(places.flat()), 3));
  geometry.setAttribute("color", new BufferAttribute(new Float32Array(places.length * 3).fill(1), 3));
  geometry.setAttribute("starSize", new BufferAttribute(new Float32Array(places.length).fill(3), 1));
  const points = new Points(geometry);
  points.userData.pick = true;
  return points;
}

function eye() {
  const camera = new PerspectiveCamera(40, 1.6, 0.1, 1000);
  camera.position.set(0, 0, 10);
  return camera;
}

function named(text: string, x: number, y: number) {
  const object = new Object3D();
  object.position.set(x, y, 0);
  object.userData.label = { text, sizePx: 16, colour: [1, 1, 1], priority: 1, offsetPx: 6 };
  return object;
}

test("an empty scene is the background, opaque, byte for byte", () => {
  const { data } = renderFrame(new Scene(), eye(), { ...size, background: NIGHT });
  expect(data.length).toBe(320 * 200 * 4);
  expect(data.every((byte, at) => byte === [10, 15, 28, 255][at % 4])).toBe(true);
});

test("the same scene gives the same bytes, whether the memory is new or used", () => {
  const scene = new Scene().add(starsAt([0, 0, 0], [1.2, 0.7, -3]), named("β Tucanae", 0, 0));
  const options = { ...size, background: NIGHT, fonts };
  const first = renderFrame(scene, eye(), options);
  const kept = first.data.slice();
  const other = renderFrame(new Scene().add(starsAt([-2, -1, 0])), eye(), { ...options, memory: first.memory });
  expect(other.data).not.toEqual(kept);
  expect(renderFrame(scene, eye(), { ...options, memory: other.memory }).data).toEqual(kept);
  expect(renderFrame(scene, eye(), options).data).toEqual(kept);
});

test("stars, lines and names behind the camera are not drawn", () => {
  const line = new LineSegments(
    new BufferGeometry().setAttribute("position", new BufferAttribute(Float64Array.of(-1, 0, 12, 1, 0, 30), 3)),
    new LineBasicMaterial({ color: new Color(1, 1, 1) }),
  );
  const behind = named("behind", 0, 0);
  behind.position.z = 20;
  const { data, labels } = renderFrame(new Scene().add(starsAt([0, 0, 11]), line, behind), eye(), { ...size, fonts });
  expect(labels).toEqual([]);
  expect(data.every((byte, at) => byte === (at % 4 === 3 ? 255 : 0))).toBe(true);
});

test("names are placed without overlap, and none over a star", () => {
  const places = Array.from({ length: 12 }, (_, at) => [((at % 4) - 1.5) * 0.8, Math.floor(at / 4) * 0.5, 0] as const);
  const stars = starsAt(...places.map(([x, y, z]) => [x, y, z] as [number, number, number]));
  stars.userData.keepOut = true;
  const scene = new Scene().add(stars, ...places.map(([x, y], at) => named(`Star ${at}`, x, y)));
  const camera = eye();
  const { labels } = renderFrame(scene, camera, { ...size, fonts });
  const projector = projectorOf(camera, size.width, size.height);
  const pixels = places.map((place) => {
    const out = new Float64Array(3);
    project(projector, ...place, out);
    return out;
  });
  expect(labels.length).toBeGreaterThan(3);
  for (const { left, right, top, bottom } of labels) {
    expect(pixels.some(([x, y]) => x! > left && x! < right && y! > top && y! < bottom)).toBe(false);
  }
  for (const [at, label] of labels.entries()) {
    expect(labels.slice(0, at).some((other) => overlaps(label, other))).toBe(false);
  }
});

test("a letter that the first face lacks comes from the next", () => {
  const ink = (text: string, faces: typeof head) => {
    const { data } = renderFrame(new Scene().add(named(text, 0, 0)), eye(), {
      ...size,
      fonts: { head: faces, body: faces },
    });
    return data.reduce((total, byte, at) => (at % 4 === 3 ? total : total + byte), 0);
  };
  expect(ink("β", head)).toBe(ink("β", head.slice(1)));
  expect(ink("β", head)).not.toBe(ink("β", head.slice(0, 1)));
});

test("picking finds the star nearest to the finger within reach, never one behind the eye", () => {
  const scene = new Scene().add(starsAt([0, 0, 0], [0.3, 0, 0], [0, 0, 20]));
  const camera = eye();
  expect(pickStar(scene, camera, size, 160, 100, 20)?.index).toBe(0);
  expect(pickStar(scene, camera, size, 167, 100, 20)?.index).toBe(1);
  expect(pickStar(scene, camera, size, 160, 150, 20)).toBeNull();
});

test("of two stars in one line of sight the nearer is picked", () => {
  expect(pickStar(new Scene().add(starsAt([0, 0, -5], [0, 0, 2])), eye(), size, 160, 100, 20)?.index).toBe(1);
});
