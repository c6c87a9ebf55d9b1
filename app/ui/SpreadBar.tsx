import { classes } from "./classes.ts";
import { type Band, type Domain, fitDomain, logPlace, type Spread, spreadGeometry } from "./spread-geometry.ts";

export interface SpreadTick {
  at: number;
  label?: string;
}

export interface SpreadBarProps extends Spread {
  /** The whole picture in words: "25.04 light-years, between 24.98 and 25.11". */
  label: string;
  /** Give the same axis to bars that are compared; by default it is fitted to this spread alone. */
  domain?: Domain;
  /** Only on the large size. */
  ticks?: readonly SpreadTick[];
  size?: "small" | "large";
  /** Paler: superseded, or not the one in use. */
  muted?: boolean;
  className?: string;
}

/** Height of the drawing, and where its axis runs, in pixels. */
const SIZES = {
  small: { height: 18, axis: 9, band: 8, mark: 16 },
  large: { height: 28, axis: 14, band: 9, mark: 24 },
};
const LABEL_ROOM = 20;
/** Narrower than this a band would hide behind the mark of the value. */
const HAIR_PERCENT = 2;

/**
 * Low, value, high on a log axis: the same mark in tables, review, kiosk and print. Horizontal places are percentages, so
 * it grows with its box while its lines keep their weight. A band that would
 * vanish behind the mark of its value gets an outline, so that a very small uncertainty is still seen.
 */
export function SpreadBar(props: SpreadBarProps) {
  const { label, domain = fitDomain([props]), ticks = [], size = "small", muted, className } = props;
  const bar = spreadGeometry(props, domain);
  const shape = SIZES[size];
  const shown = size === "large" ? ticks : [];
  const top = shown.some((tick) => tick.label) ? LABEL_ROOM : 0;
  const axis = top + shape.axis;
  return (
    <svg
      role="img"
      aria-label={label}
      width="100%"
      height={top + shape.height}
      data-mark
      className={classes("block overflow-visible", className)}
    >
      <line x1="0" x2="100%" y1={axis} y2={axis} className="stroke-rule forced-colors:stroke-[CanvasText]" />
      <Bar band={bar.band90} axis={axis} height={shape.band + 4} muted={muted} pale />
      <Bar band={bar.band68} axis={axis} height={shape.band} muted={muted} />
      {shown.map((tick) => (
        <Tick key={tick.at} tick={tick} place={logPlace(domain)(tick.at)} axis={axis} />
      ))}
      {bar.value === null ? null : (
        <line
          x1={`${bar.value}%`}
          x2={`${bar.value}%`}
          y1={axis - shape.mark / 2}
          y2={axis + shape.mark / 2}
          strokeWidth={size === "large" ? 3 : 2}
          className="stroke-ink forced-colors:stroke-[CanvasText]"
        />
      )}
    </svg>
  );
}

interface BarProps {
  band: Band | null;
  axis: number;
  height: number;
  muted: boolean | undefined;
  pale?: boolean;
}

function Bar({ band, axis, height, muted, pale }: BarProps) {
  if (!band) return null;
  const look = classes(
    "fill-vermilion stroke-vermilion forced-colors:fill-[Highlight] forced-colors:stroke-[Highlight]",
    pale ? "opacity-25" : muted && "opacity-55",
  );
  return (
    <g className={look}>
      <rect
        x={`${band.start}%`}
        y={axis - height / 2}
        width={`${band.width}%`}
        height={height}
        strokeWidth={!pale && band.width < HAIR_PERCENT ? 5 : 0}
      />
      {band.openStart ? <OpenEnd at="0%" axis={axis} height={height} turn={-1} /> : null}
      {band.openEnd ? <OpenEnd at="100%" axis={axis} height={height} turn={1} /> : null}
    </g>
  );
}

/** A point in the direction in which the range goes on. */
function OpenEnd({ at, axis, height, turn }: { at: string; axis: number; height: number; turn: 1 | -1 }) {
  const half = height / 2 + 2;
  return (
    <svg x={at} y={axis} overflow="visible" aria-hidden="true">
      <path d={`M0 ${-half}L${turn * half} 0L0 ${half}Z`} stroke="none" />
    </svg>
  );
}

function Tick({ tick, place, axis }: { tick: SpreadTick; place: number; axis: number }) {
  if (place < 0 || place > 100) return null;
  const anchor = place < 6 ? "start" : place > 94 ? "end" : "middle";
  return (
    <g>
      <line x1={`${place}%`} x2={`${place}%`} y1={axis - 4} y2={axis + 4} className="stroke-ink-soft" />
      {tick.label ? (
        <text x={`${place}%`} y={13} textAnchor={anchor} className="fill-ink-soft font-head text-xs">
          {tick.label}
        </text>
      ) : null}
    </g>
  );
}
