/** Pixels, y down. */
export interface Rectangle {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

export interface LabelRequest {
  /** What the label belongs to, px. */
  x: number;
  y: number;
  width: number;
  height: number;
  /** Room between the point and the label, px. */
  offset: number;
  /** Higher is placed first. */
  priority: number;
}

export interface LabelPlace<T extends LabelRequest> extends Rectangle {
  request: T;
}

/** Shares of the label's size and of the offset, in order of choice: below right first, as on a printed chart. */
const ANCHORS = [
  { x: 0, y: 0, dx: 0.75, dy: 0.75 },
  { x: 0, y: -1, dx: 0.75, dy: -0.75 },
  { x: -1, y: 0, dx: -0.75, dy: 0.75 },
  { x: -1, y: -1, dx: -0.75, dy: -0.75 },
  { x: 0, y: -0.5, dx: 1, dy: 0 },
  { x: -1, y: -0.5, dx: -1, dy: 0 },
  { x: -0.5, y: 0, dx: 0, dy: 1 },
  { x: -0.5, y: -1, dx: 0, dy: -1 },
] as const;

export function overlaps(a: Rectangle, b: Rectangle): boolean {
  return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
}

/**
 * Finds a place beside its point for each label, most important first, at one of eight anchors. A label that fits at none
 * is left out. No two placed labels overlap, none overlaps `keepOut`, all lie inside the frame.
 */
export function placeLabels<T extends LabelRequest>(
  requests: readonly T[],
  frame: { width: number; height: number },
  keepOut: readonly Rectangle[] = [],
): LabelPlace<T>[] {
  const taken: Rectangle[] = [...keepOut];
  const places: LabelPlace<T>[] = [];
  for (const request of [...requests].sort((a, b) => b.priority - a.priority)) {
    const place = ANCHORS.map((anchor) => at(request, anchor)).find(
      (box) => inside(box, frame) && !taken.some((other) => overlaps(box, other)),
    );
    if (!place) continue;
    taken.push(place);
    places.push({ request, ...place });
  }
  return places;
}

function at(request: LabelRequest, anchor: (typeof ANCHORS)[number]): Rectangle {
  const left = request.x + anchor.x * request.width + anchor.dx * request.offset;
  const top = request.y + anchor.y * request.height + anchor.dy * request.offset;
  return { left, top, right: left + request.width, bottom: top + request.height };
}

function inside(box: Rectangle, frame: { width: number; height: number }): boolean {
  return box.left >= 0 && box.top >= 0 && box.right <= frame.width && box.bottom <= frame.height;
}
