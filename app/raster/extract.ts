import type { BufferGeometry, Object3D, Points, Scene } from "three";
import type { Rgb } from "./colour.ts";

/** What `Object3D.userData.label` may hold. Sizes in px before the pixel ratio, colours in linear light. */
export interface LabelData {
  text: string;
  /** A second, smaller line. */
  sub?: string;
  sizePx: number;
  colour: Rgb;
  subColour?: Rgb;
  priority: number;
  /** Room between the point and the label. */
  offsetPx: number;
  /** "body" sets the text in the running face. */
  face?: "head" | "body";
  /** World places x, y, z, ... to choose from: the label stands at the one nearest to the lower right. */
  along?: ArrayLike<number>;
  /** In a screen group: the text ends here, and is never left out or moved. */
  align?: "left" | "right";
}

export interface Extracted {
  /** Lines and points in the order they are painted. */
  drawn: Object3D[];
  labelled: Object3D[];
  marked: Object3D[];
  /** Groups in screen pixels: see userData.screen. */
  screens: Object3D[];
}

/** The visible objects of a scene in render order. A group with userData.screen is kept whole, for later. */
export function extract(scene: Scene): Extracted {
  const found: Extracted = { drawn: [], labelled: [], marked: [], screens: [] };
  gather(scene, found);
  found.drawn.sort((a, b) => a.renderOrder - b.renderOrder);
  return found;
}

function gather(object: Object3D, found: Extracted): void {
  if (!object.visible) return;
  if (object.userData.screen) {
    found.screens.push(object);
    return;
  }
  if (isLine(object) || isPoints(object)) found.drawn.push(object);
  if (object.userData.label) found.labelled.push(object);
  if (object.userData.marker) found.marked.push(object);
  for (const child of object.children) gather(child, found);
}

export type LineObject = Object3D & {
  geometry: BufferGeometry;
  material: { color?: { r: number; g: number; b: number }; opacity?: number; linewidth?: number; visible?: boolean };
  isLineSegments?: boolean;
  isLineLoop?: boolean;
};

export function isLine(object: Object3D): object is LineObject {
  return (object as { isLine?: boolean }).isLine === true;
}

export function isPoints(object: Object3D): object is Points {
  return (object as { isPoints?: boolean }).isPoints === true;
}

/** Pairs of vertex numbers, one pair a straight piece. */
export function segmentsOf(line: LineObject): [from: number, to: number][] {
  const vertices = verticesOf(line.geometry);
  const pairs: [number, number][] = [];
  const step = line.isLineSegments ? 2 : 1;
  for (let at = 0; at + 1 < vertices.length; at += step) pairs.push([vertices[at]!, vertices[at + 1]!]);
  if (line.isLineLoop && vertices.length > 2) pairs.push([vertices.at(-1)!, vertices[0]!]);
  return pairs;
}

/** The vertex numbers a geometry draws, through its index and its draw range. */
export function verticesOf(geometry: BufferGeometry): number[] {
  const position = geometry.getAttribute("position");
  if (!position) return [];
  const { index, drawRange } = geometry;
  const count = index ? index.count : position.count;
  const end = Math.min(count, drawRange.start + drawRange.count);
  const vertices: number[] = [];
  for (let at = drawRange.start; at < end; at++) vertices.push(index ? index.getX(at) : at);
  return vertices;
}
