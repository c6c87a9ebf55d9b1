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
  /** A smaller form of the label, tried where the whole one fits nowhere. */
  reduced?: { width: number; height: number } | undefined;
}

export interface LabelPlace<T extends LabelRequest> extends Rectangle {
  request: T;
  /** The smaller form was taken. */
  isReduced: boolean;
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

interface Size {
  width: number;
  height: number;
}

/**
 * Finds a place beside its point for each label, most important first, at one of eight anchors. Smaller forms are placed
 * first, so that as many points as can be have their name; then those with room around them grow to the whole. A label
 * that fits at no anchor is left out. No two placed labels overlap, none overlaps `keepOut`, all lie inside the frame, and
 * none is nearer to the point of another label than to its own: it would be read as the other's.
 */
export function placeLabels<T extends LabelRequest>(
  requests: readonly T[],
  frame: Size,
  keepOut: readonly Rectangle[] = [],
): LabelPlace<T>[] {
  const ordered = [...requests].sort((a, b) => b.priority - a.priority);
  const places: LabelPlace<T>[] = [];
  const find = (request: T, size: Size, others: readonly Rectangle[]) =>
    ANCHORS.map((anchor) => at(request, size, anchor)).find(
      (box) =>
        inside(box, frame) &&
        ![...keepOut, ...others].some((other) => overlaps(box, other)) &&
        !requests.some((rival) => squareTo(box, rival) < squareTo(box, request)),
    );
  for (const request of ordered) {
    const place = find(request, request.reduced ?? request, places);
    if (place) places.push({ request, isReduced: Boolean(request.reduced), ...place });
  }
  for (const [index, place] of places.entries()) {
    if (!place.isReduced) continue;
    const others = places.filter((other) => other !== place);
    const whole = find(place.request, place.request, others);
    if (whole) places[index] = { request: place.request, isReduced: false, ...whole };
  }
  return places;
}

/** The square of the distance from a box to a label's point. */
function squareTo(box: Rectangle, { x, y }: LabelRequest): number {
  const dx = Math.max(box.left - x, 0, x - box.right);
  const dy = Math.max(box.top - y, 0, y - box.bottom);
  return dx * dx + dy * dy;
}

function at({ x, y, offset }: LabelRequest, { width, height }: Size, anchor: (typeof ANCHORS)[number]): Rectangle {
  const left = x + anchor.x * width + anchor.dx * offset;
  const top = y + anchor.y * height + anchor.dy * offset;
  return { left, top, right: left + width, bottom: top + height };
}

function inside(box: Rectangle, frame: Size): boolean {
  return box.left >= 0 && box.top >= 0 && box.right <= frame.width && box.bottom <= frame.height;
}
