import { type KeyboardEvent, useRef } from "react";
import { type ChangeOrbit, usePointerOrbit } from "./use-pointer-orbit.ts";

interface StageRegionProps {
  name: string;
  /** The element that says what the keys do. */
  keysId: string;
  wheelAlways: boolean;
  onKeyDown: (event: KeyboardEvent<HTMLElement>) => void;
  onTap: (x: number, y: number) => void;
  changeOrbit: ChangeOrbit;
}

/** What hands and keys touch: it lies over the canvas, takes the focus, and is there only while the stage draws. */
export function StageRegion({ name, keysId, wheelAlways, onKeyDown, onTap, changeOrbit }: StageRegionProps) {
  const region = useRef<HTMLDivElement>(null);
  const pointer = usePointerOrbit(region, changeOrbit, { onTap, wheelAlways });
  return (
    <div
      ref={region}
      role="application"
      aria-label={name}
      aria-describedby={keysId}
      // biome-ignore lint/a11y/noNoninteractiveTabindex: the arrow keys turn the stage, so it takes the focus
      tabIndex={0}
      onKeyDown={onKeyDown}
      {...pointer}
      className="absolute inset-0 cursor-grab touch-none select-none focus-visible:-outline-offset-4 active:cursor-grabbing"
    />
  );
}
