import type { Path } from "opentype.js";

/** Receives the straight pieces of an outline, in pixels. */
export type Edge = (x0: number, y0: number, x1: number, y1: number) => void;

/** Pieces a curve is cut into: at the sizes labels have, far finer than a pixel. */
const PIECES = 8;

/** Walks closed contours; curves come as straight pieces. */
export function walkOutline(path: Path, edge: Edge): void {
  let x = 0;
  let y = 0;
  let startX = 0;
  let startY = 0;
  const to = (nextX: number, nextY: number) => {
    edge(x, y, nextX, nextY);
    x = nextX;
    y = nextY;
  };
  for (const command of path.commands) {
    if (command.type === "M") {
      to(startX, startY);
      x = startX = command.x;
      y = startY = command.y;
    } else if (command.type === "L") to(command.x, command.y);
    else if (command.type === "Q") quadratic(x, y, command.x1, command.y1, command.x, command.y, to);
    else if (command.type === "C") {
      cubic(x, y, command.x1, command.y1, command.x2, command.y2, command.x, command.y, to);
    } else to(startX, startY);
  }
  to(startX, startY);
}

type To = (x: number, y: number) => void;

function quadratic(x0: number, y0: number, x1: number, y1: number, x2: number, y2: number, to: To): void {
  for (let piece = 1; piece <= PIECES; piece++) {
    const t = piece / PIECES;
    const s = 1 - t;
    to(s * s * x0 + 2 * s * t * x1 + t * t * x2, s * s * y0 + 2 * s * t * y1 + t * t * y2);
  }
}

function cubic(
  x0: number,
  y0: number,
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  x3: number,
  y3: number,
  to: To,
): void {
  for (let piece = 1; piece <= PIECES; piece++) {
    const t = piece / PIECES;
    const s = 1 - t;
    const [a, b, c, d] = [s * s * s, 3 * s * s * t, 3 * s * t * t, t * t * t];
    to(a * x0 + b * x1 + c * x2 + d * x3, a * y0 + b * y1 + c * y2 + d * y3);
  }
}
