/**
 * Exact-area coverage of closed contours. Each edge leaves, in every pixel row it passes, the area to its right in the
 * pixels it crosses; a running sum along the row turns that into coverage. The method of signed area accumulation,
 * common practice in font rasterisers, no single source.
 */
export interface AreaBuffer {
  width: number;
  height: number;
  /** One more column than the width, for the area that runs out to the right. */
  sums: Float32Array;
}

export function createArea(width: number, height: number): AreaBuffer {
  return { width, height, sums: new Float32Array((width + 2) * height) };
}

/** Adds one edge; all of it must lie inside the buffer. */
export function addEdge(area: AreaBuffer, x0: number, y0: number, x1: number, y1: number): void {
  if (y0 === y1) return;
  const direction = y0 < y1 ? 1 : -1;
  const [topX, topY, bottomX, bottomY] = y0 < y1 ? [x0, y0, x1, y1] : [x1, y1, x0, y0];
  const slope = (bottomX - topX) / (bottomY - topY);
  const lastRow = Math.min(area.height - 1, Math.ceil(bottomY) - 1);
  for (let row = Math.max(0, Math.floor(topY)); row <= lastRow; row++) {
    const from = Math.max(row, topY);
    const to = Math.min(row + 1, bottomY);
    addRow(area, row, topX + (from - topY) * slope, topX + (to - topY) * slope, (to - from) * direction);
  }
}

/** The part of an edge in one row: from x to x, over a signed height of at most 1. */
function addRow(area: AreaBuffer, row: number, fromX: number, toX: number, height: number): void {
  const left = Math.min(fromX, toX);
  const right = Math.max(fromX, toX);
  const base = row * (area.width + 2);
  const first = Math.floor(left);
  const last = Math.max(first, Math.ceil(right) - 1);
  for (let column = first; column <= last; column++) {
    // Share of the height passed by the end of this column, and the mean room to the right of the edge inside it.
    const enter = Math.max(left, column);
    const leave = Math.min(right, column + 1);
    const share = right > left ? (leave - enter) / (right - left) : 1;
    const inside = share * (column + 1 - (enter + leave) / 2);
    add(area, base + column, inside * height, column);
    // Pixels farther right have the whole of this share; the running sum carries it on.
    add(area, base + column + 1, (share - inside) * height, column + 1);
  }
}

function add(area: AreaBuffer, at: number, amount: number, column: number): void {
  if (column >= 0 && column < area.width + 2) area.sums[at] = area.sums[at]! + amount;
}

/** Coverage, 0 to 1, row by row. */
export function coverageOf(area: AreaBuffer): Float32Array {
  const { width, height, sums } = area;
  const coverage = new Float32Array(width * height);
  for (let row = 0; row < height; row++) {
    let sum = 0;
    for (let column = 0; column < width; column++) {
      sum += sums[row * (width + 2) + column]!;
      coverage[row * width + column] = Math.min(Math.abs(sum), 1);
    }
  }
  return coverage;
}
