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

interface Room extends Size {
  keepOut: readonly Rectangle[];
  /** Room kept between two labels, px. */
  gap: number;
}

/** Times the labels that found no place are let go first. */
const ROUNDS = 3;

/**
 * Finds a place beside its point for each label, most important first, at one of eight anchors. Smaller forms are placed
 * first, so that as many points as can be have their name; then those with room around them grow to the whole. A label
 * that fits at no anchor is left out. No two placed labels overlap, none overlaps `keepOut`, all lie inside the frame, and
 * none is nearer to the point of another label than to its own: it would be read as the other's.
 */
export function placeLabels<T extends LabelRequest>(
  requests: readonly T[],
  { width, height }: Size,
  keepOut: readonly Rectangle[] = [],
  gap = 0,
): LabelPlace<T>[] {
  const room: Room = { width, height, keepOut, gap };
  const ordered = [...requests].sort((a, b) => b.priority - a.priority);
  return growPlaces(namePlaces(ordered, requests, room), requests, room);
}

/**
 * The smaller forms, in the given order. Then those left out go first, which is kept only when every label that had a
 * place still has one: nothing less important takes the place of anything more important.
 */
function namePlaces<T extends LabelRequest>(ordered: readonly T[], rivals: readonly T[], room: Room): LabelPlace<T>[] {
  let best = namePass(ordered, rivals, room);
  let order = ordered;
  for (let round = 0; round < ROUNDS && best.length < ordered.length; round++) {
    const placed = new Set(best.map(({ request }) => request));
    order = [...order.filter((request) => !placed.has(request)), ...order.filter((request) => placed.has(request))];
    const next = namePass(order, rivals, room);
    const kept = new Set(next.map(({ request }) => request));
    if (next.length > best.length && best.every(({ request }) => kept.has(request))) best = next;
  }
  return best;
}

function namePass<T extends LabelRequest>(ordered: readonly T[], rivals: readonly T[], room: Room): LabelPlace<T>[] {
  const places: LabelPlace<T>[] = [];
  for (const request of ordered) {
    const place = freePlace(request, request.reduced ?? request, places, rivals, room);
    if (place) places.push({ request, isReduced: Boolean(request.reduced), ...place });
  }
  return places;
}

function growPlaces<T extends LabelRequest>(
  places: readonly LabelPlace<T>[],
  rivals: readonly T[],
  room: Room,
): LabelPlace<T>[] {
  const grown = [...places];
  for (const [index, place] of places.entries()) {
    if (!place.isReduced) continue;
    const others = grown.filter((_, at) => at !== index);
    const whole = freePlace(place.request, place.request, others, rivals, room);
    if (whole) grown[index] = { request: place.request, isReduced: false, ...whole };
  }
  return grown;
}

function freePlace(
  request: LabelRequest,
  size: Size,
  others: readonly Rectangle[],
  rivals: readonly LabelRequest[],
  { keepOut, gap, ...frame }: Room,
): Rectangle | undefined {
  return ANCHORS.map((anchor) => at(request, size, anchor)).find(
    (box) =>
      inside(box, frame) &&
      !keepOut.some((other) => overlaps(box, other)) &&
      !others.some((other) => overlaps(widened(box, gap), other)) &&
      !rivals.some((rival) => squareTo(box, rival) < squareTo(box, request)),
  );
}

const widened = ({ left, top, right, bottom }: Rectangle, by: number): Rectangle => ({
  left: left - by,
  top,
  right: right + by,
  bottom,
});

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
