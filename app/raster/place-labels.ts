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

/**
 * Finds a place beside its point for each label, most important first, at one of eight anchors. A label that fits at none
 * is tried in its smaller form, then left out. No two placed labels overlap, none overlaps `keepOut`, all lie inside the frame.
 */
export function placeLabels<T extends LabelRequest>(
  requests: readonly T[],
  frame: Size,
  keepOut: readonly Rectangle[] = [],
): LabelPlace<T>[] {
  const taken: Rectangle[] = [...keepOut];
  const places: LabelPlace<T>[] = [];
  for (const request of [...requests].sort((a, b) => b.priority - a.priority)) {
    const whole = freePlace(request, request, frame, taken);
    const place = whole ?? (request.reduced && freePlace(request, request.reduced, frame, taken));
    if (!place) continue;
    taken.push(place);
    places.push({ request, isReduced: !whole, ...place });
  }
  return places;
}

interface Size {
  width: number;
  height: number;
}

function freePlace(request: LabelRequest, size: Size, frame: Size, taken: readonly Rectangle[]): Rectangle | undefined {
  return ANCHORS.map((anchor) => at(request, size, anchor)).find(
    (box) => inside(box, frame) && !taken.some((other) => overlaps(box, other)),
  );
}

function at({ x, y, offset }: LabelRequest, { width, height }: Size, anchor: (typeof ANCHORS)[number]): Rectangle {
  const left = x + anchor.x * width + anchor.dx * offset;
  const top = y + anchor.y * height + anchor.dy * offset;
  return { left, top, right: left + width, bottom: top + height };
}

function inside(box: Rectangle, frame: Size): boolean {
  return box.left >= 0 && box.top >= 0 && box.right <= frame.width && box.bottom <= frame.height;
}
