import {
  BufferAttribute,
  BufferGeometry,
  Color,
  LineBasicMaterial,
  LineLoop,
  LineSegments,
  Object3D,
  Points,
} from "three";
import type { Rgb } from "#app/raster/colour.ts";
import type { LabelData } from "#app/raster/extract.ts";

/** Doubles all the way: three's own kinds of attribute would round places to single precision. */
export function places(numbers: readonly number[]): BufferAttribute {
  return new BufferAttribute(Float64Array.from(numbers), 3);
}

interface LineLook {
  colour: Rgb;
  widthPx: number;
  opacity?: number;
}

function look<T extends Object3D>(line: T, { widthPx }: LineLook): T {
  line.userData.widthPx = widthPx;
  return line;
}

const material = ({ colour, opacity = 1 }: LineLook) =>
  new LineBasicMaterial({ color: new Color(...colour), opacity, transparent: opacity < 1 });

const geometry = (numbers: readonly number[]) => new BufferGeometry().setAttribute("position", places(numbers));

export function loop(numbers: readonly number[], lineLook: LineLook): LineLoop {
  return look(new LineLoop(geometry(numbers), material(lineLook)), lineLook);
}

export function segments(numbers: readonly number[], lineLook: LineLook): LineSegments {
  return look(new LineSegments(geometry(numbers), material(lineLook)), lineLook);
}

export function lights(
  stars: readonly { position: readonly number[]; colour: readonly number[]; sizePx: number }[],
): Points {
  const shape = geometry(stars.flatMap(({ position }) => [...position]));
  shape.setAttribute("color", new BufferAttribute(Float32Array.from(stars.flatMap(({ colour }) => [...colour])), 3));
  shape.setAttribute(
    "starSize",
    new BufferAttribute(
      Float32Array.from(stars, ({ sizePx }) => sizePx),
      1,
    ),
  );
  const points = new Points(shape);
  points.userData.keepOut = true;
  return points;
}

export function label(position: readonly number[], data: LabelData): Object3D {
  const object = new Object3D();
  object.position.set(position[0] ?? 0, position[1] ?? 0, position[2] ?? 0);
  object.userData.label = data;
  return object;
}
