import { gaussLegendre, type Rule } from "./gauss-legendre.ts";
import type { AnchoredDensity } from "./posterior-density.ts";

/** One panel of the composite rule, with the probability (not normalised) in it. */
interface Panel {
  from: number;
  to: number;
  mass: number;
  /** The density at either end. */
  atFrom: number;
  atTo: number;
}

/** The panels in ascending order, with gaps where nothing is to be found. */
export interface Mass {
  panels: Panel[];
  total: number;
  /** The density in v: exp(G), one at its highest. */
  density(v: number): number;
}

/** A stretch over which the log density only rises or only falls; either outer end may be infinite. */
export interface Stretch {
  top: number;
  bottom: number;
}

/** What lies this many nats below the highest peak is left out: exp(-40) is 4e-18. */
export const DEPTH = 40;
/** Below this depth a panel's own error no longer shows. */
const SHALLOW = 26;
/** Longest panel in ln r, and greatest change of the log density across half of it, for sixteen nodes. */
const LONGEST = 2;
const STEEPEST = 7;

/** A step of Newton's, in panels, after which no other is needed. */
const CLOSE = 1e-5;
/** For a panel, and for a step of an eighth of one or less. */
const PANEL_RULE = gaussLegendre(16);
const STEP_RULE = gaussLegendre(8);

function integrate(density: Mass["density"], from: number, to: number, { nodes, weights }: Rule): number {
  const half = (to - from) / 2;
  const middle = from + half;
  let sum = 0;
  for (let i = 0; i < nodes.length; i++) sum += weights[i]! * density(middle + half * nodes[i]!);
  return half * sum;
}

/** Where, from the top towards the bottom, the log density has fallen by DEPTH (or by a few nats more). */
function reach(log: AnchoredDensity, { top, bottom }: Stretch, floor: number): number {
  if (Number.isFinite(bottom) && log.at(bottom) >= floor) return bottom;
  const direction = bottom > top ? 1 : -1;
  let step = log.stepAt(top);
  let inside = top;
  let outside = top + direction * step;
  while (log.at(outside) >= floor) {
    inside = outside;
    step *= 2;
    outside += direction * step;
    if ((bottom - outside) * direction < 0) outside = bottom;
  }
  for (let turn = 0; turn < 60 && log.at(outside) < floor - 6; turn++) {
    const middle = (inside + outside) / 2;
    if (log.at(middle) >= floor) inside = middle;
    else outside = middle;
  }
  return outside;
}

/**
 * Integrates exp(G) over stretches by Gauss-Legendre panels, halved until G is nearly a low polynomial in each.
 * @param stretches ascending and adjoining; together all that the distance may be
 * @param peak the highest value of G
 * @param cuts places where a panel must end, so that masses to either side can be told apart
 */
export function probabilityMass(log: AnchoredDensity, stretches: Stretch[], peak: number, cuts: number[]): Mass {
  const panels: Panel[] = [];
  const density = (v: number) => Math.exp(log.at(v) - peak);

  function divide(from: number, logFrom: number, to: number, logTo: number): void {
    const middle = (from + to) / 2;
    const logMiddle = log.at(middle);
    const negligible = Math.max(logFrom, logTo) < peak - SHALLOW;
    const steepness = Math.max(Math.abs(logFrom - logMiddle), Math.abs(logTo - logMiddle));
    const tame = to - from <= LONGEST && steepness <= STEEPEST;
    if (negligible || tame || middle <= from || middle >= to) {
      const mass = integrate(density, from, to, PANEL_RULE);
      panels.push({ from, to, mass, atFrom: Math.exp(logFrom - peak), atTo: Math.exp(logTo - peak) });
      return;
    }
    divide(from, logFrom, middle, logMiddle);
    divide(middle, logMiddle, to, logTo);
  }

  for (const stretch of stretches) {
    if (log.at(stretch.top) < peak - DEPTH) continue;
    const end = reach(log, stretch, peak - DEPTH);
    const [low, high] = [Math.min(stretch.top, end), Math.max(stretch.top, end)];
    const ends = [low, ...cuts.filter((v) => v > low && v < high), high];
    for (let i = 1; i < ends.length; i++) divide(ends[i - 1]!, log.at(ends[i - 1]!), ends[i]!, log.at(ends[i]!));
  }
  return { panels, total: panels.reduce((sum, panel) => sum + panel.mass, 0), density };
}

/** The probability below a cut, 0 to 1. */
export function shareBelow(mass: Mass, v: number): number {
  return mass.panels.reduce((sum, panel) => (panel.to <= v ? sum + panel.mass : sum), 0) / mass.total;
}

/**
 * First guess, 0 to 1 along a panel, of the place below which a share of its mass lies: on the cubic that has the
 * panel's mass and the density at its ends.
 */
function guess({ from, to, mass, atFrom, atTo }: Panel, share: number): number {
  const [start, end] = [(atFrom * (to - from)) / mass, (atTo * (to - from)) / mass];
  let [low, high, at] = [0, 1, share];
  for (let turn = 0; turn < 5; turn++) {
    const below = at * (start + at * (3 - 2 * start - end + at * (start + end - 2)));
    if (below < share) low = at;
    else high = at;
    const slope = start + at * (2 * (3 - 2 * start - end) + 3 * at * (start + end - 2));
    const next = at + (share - below) / slope;
    at = next > low && next < high ? next : (low + high) / 2;
  }
  return at;
}

/** Newton's method for the place in a panel below which the wanted mass lies; halves where Newton leaves the panel. */
function solve(panel: Panel, density: Mass["density"], wanted: number): number {
  const { from, to, mass } = panel;
  let [low, high] = [from, to];
  let v = from + (to - from) * guess(panel, wanted / mass);
  let below = integrate(density, from, v, PANEL_RULE);
  for (let turn = 0; turn < 100; turn++) {
    if (below < wanted) low = v;
    else high = v;
    const newton = v + (wanted - below) / density(v);
    const next = newton >= low && newton <= high ? newton : (low + high) / 2;
    const step = Math.abs(next - v) / (to - from);
    // What is left after a step of Newton's goes as the square of that step.
    if (next === v || (next === newton && step <= CLOSE)) return next;
    below += integrate(density, v, next, step <= 1 / 8 ? STEP_RULE : PANEL_RULE);
    v = next;
  }
  return v;
}

/**
 * The v below which the given probability lies.
 * @param probability strictly between 0 and 1
 */
export function quantile(mass: Mass, probability: number): number {
  let wanted = probability * mass.total;
  for (const panel of mass.panels) {
    if (wanted <= panel.mass) return solve(panel, mass.density, wanted);
    wanted -= panel.mass;
  }
  return mass.panels.at(-1)!.to;
}
