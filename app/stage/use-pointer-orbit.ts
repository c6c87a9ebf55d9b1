import { type PointerEvent, type RefObject, useEffect, useRef } from "react";
import type { Orbit } from "./camera.ts";
import { moved, turned } from "./orbit.ts";

/** A drag across the whole width turns this far. */
const DEGREES_PER_WIDTH = 240;
/** A press that moves less than this is a tap. */
const TAP_PX = 8;

export type ChangeOrbit = (change: (orbit: Orbit) => Orbit) => void;
interface Press {
  x: number;
  y: number;
}

/**
 * Drag turns, two fingers pinch, a tap picks, the wheel goes nearer and farther. A page that scrolls keeps its wheel
 * until the stage has been focused, or control is held (which is what a pinch on a trackpad says).
 */
export function usePointerOrbit(
  region: RefObject<HTMLElement | null>,
  change: ChangeOrbit,
  { onTap, wheelAlways }: { onTap: (x: number, y: number) => void; wheelAlways: boolean },
) {
  const presses = useRef(new Map<number, Press>());
  const travelled = useRef(0);
  useWheel(region, change, wheelAlways);

  function onPointerDown(event: PointerEvent<HTMLElement>) {
    if (event.button !== 0) return;
    if (presses.current.size === 0) travelled.current = 0;
    presses.current.set(event.pointerId, { x: event.clientX, y: event.clientY });
    event.currentTarget.setPointerCapture(event.pointerId);
  }
  function onPointerMove(event: PointerEvent<HTMLElement>) {
    const before = presses.current.get(event.pointerId);
    if (!before) return;
    const now = { x: event.clientX, y: event.clientY };
    const other = [...presses.current].find(([id]) => id !== event.pointerId)?.[1];
    presses.current.set(event.pointerId, now);
    travelled.current += Math.hypot(now.x - before.x, now.y - before.y);
    if (other) return pinch(before, now, other);
    if (travelled.current < TAP_PX) return;
    const perPx = DEGREES_PER_WIDTH / Math.max(event.currentTarget.clientWidth, 1);
    change((orbit) => turned(orbit, (before.x - now.x) * perPx, (now.y - before.y) * perPx));
  }
  function pinch(before: Press, now: Press, other: Press) {
    travelled.current += TAP_PX;
    const was = Math.hypot(before.x - other.x, before.y - other.y);
    const is = Math.hypot(now.x - other.x, now.y - other.y);
    if (was > 0 && is > 0) change((orbit) => moved(orbit, was / is));
  }
  function onPointerUp(event: PointerEvent<HTMLElement>) {
    if (!presses.current.delete(event.pointerId) || travelled.current >= TAP_PX) return;
    const box = event.currentTarget.getBoundingClientRect();
    onTap(event.clientX - box.left, event.clientY - box.top);
  }
  function onPointerCancel(event: PointerEvent<HTMLElement>) {
    presses.current.delete(event.pointerId);
  }
  return { onPointerDown, onPointerMove, onPointerUp, onPointerCancel };
}

/** React's own wheel listener cannot keep the page from scrolling, so this one is put on by hand. */
function useWheel(region: RefObject<HTMLElement | null>, change: ChangeOrbit, always: boolean) {
  useEffect(() => {
    const element = region.current;
    if (!element) return;
    const onWheel = (event: WheelEvent) => {
      if (!always && !event.ctrlKey && !element.contains(element.ownerDocument.activeElement)) return;
      event.preventDefault();
      change((orbit) => moved(orbit, Math.exp(event.deltaY * 0.0015)));
    };
    element.addEventListener("wheel", onWheel, { passive: false });
    return () => element.removeEventListener("wheel", onWheel);
  }, [region, change, always]);
}
