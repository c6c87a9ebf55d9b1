import { galacticXyz } from "#app/astrometry/coordinates.ts";
import { convertLength } from "#app/astrometry/units.ts";
import type { Language } from "#app/figures/language.ts";
import { distanceFigure } from "#app/figures/range-figure.ts";
import { scaleSymbolText, scaleText } from "#app/figures/scale-text.ts";
import { claimsOf, type SceneClaims, stretchText } from "./claims.ts";
import { uncertainOrder } from "./depth-order.ts";
import type { SceneDocument } from "./document.ts";
import type { CastMember, SceneMember } from "./member.ts";
import { type MissingMember, partCast } from "./missing.ts";
import { type RadialScale, radiusOf, scaleFor } from "./radial-scale.ts";
import { evenLengths, roundLengthBelow, stretchedLengths } from "./round-lengths.ts";
import { type Rgb, starColour, starSizePx } from "./star-look.ts";

export type { CastMember, SceneMember } from "./member.ts";
export type Point = [x: number, y: number, z: number];

export interface LaidStar {
  recordId: string;
  name: string;
  /** Scene units, Galactic axes: x towards the centre, y along rotation, z towards the north pole. Sun at 0. */
  position: Point;
  /** The ends of the 68 % range along the line of sight. */
  low: Point;
  high: Point;
  colour: Rgb;
  sizePx: number;
  /** "" where the name is not shown in the picture. */
  label: string;
  /** What a visitor reads of its distance. */
  distanceText: string;
  regime: SceneMember["regime"];
}

export interface VolumeLayout {
  stars: LaidStar[];
  sun: { name: string; colour: Rgb; sizePx: number };
  /** Circles around the Sun in the Galactic plane, from the inside out. */
  rings: { radius: number; label: string }[];
  /** A round length near the Sun; null where the scale is not linear. */
  scaleBar: { length: number; label: string } | null;
  /** What stands in place of the bar where the scale is not linear; null where it is. */
  stretchText: string | null;
  /** Radius of the cast, scene units: the camera's distance is counted in it. */
  extent: number;
  /** `uncertainOrder`: pairs of names whose order of distance the ranges leave open. */
  claims: SceneClaims & { uncertainOrder: [string, string][] };
  /** Those of the cast that have no place, and why. */
  missing: MissingMember[];
}

const SUN: Record<Language, string> = { en: "Sun", fr: "Soleil" };

/** Radius of a scene with nobody in it, pc. */
const EMPTY_PC = 1;

/** Places a cast around the Sun. Those who cannot be placed are in `missing`, with the reason. */
export function layoutVolume(
  document: SceneDocument,
  members: readonly CastMember[],
  language: Language = "en",
): VolumeLayout {
  const { placed, missing } = partCast(members, language);
  const distances = placed.map((member) => member.distancePc.value);
  const scale = scaleFor(document.mapping, distances);
  const farthest = distances.reduce((most, pc) => Math.max(most, pc), 0) || EMPTY_PC;
  const { rings, ringRatio } = ringsOf(document, scale, distances, language);
  const isLinear = document.mapping === "linear";
  return {
    stars: placed.map((member) => placeStar(document, scale, member, language)),
    sun: { name: SUN[language], colour: starColour(null), sizePx: 3 },
    rings,
    scaleBar: isLinear ? scaleBarOf(document, farthest, language) : null,
    stretchText: isLinear ? null : stretchText(ringRatio, language),
    extent: radiusOf(scale, farthest),
    claims: { ...claimsOf(document), uncertainOrder: uncertainOrder(placed) },
    missing,
  };
}

function placeStar(document: SceneDocument, scale: RadialScale, member: SceneMember, language: Language): LaidStar {
  const { value, low, high } = member.distancePc;
  const place = (distancePc: number): Point => {
    const { x, y, z } = galacticXyz(member.raDeg, member.decDeg, radiusOf(scale, distancePc));
    return [x, y, z];
  };
  return {
    recordId: member.recordId,
    name: member.name,
    position: place(value),
    low: place(low),
    high: place(high),
    colour: starColour(member.bv),
    sizePx: starSizePx(member.vMag),
    label: document.labels && member.labelled ? member.name : "",
    distanceText: distanceText(document, member, language),
    regime: member.regime,
  };
}

function distanceText(document: SceneDocument, member: SceneMember, language: Language): string {
  const to = (pc: number) => convertLength(pc, "pc", document.unit);
  const { value, low, high } = member.distancePc;
  const distance = { value: to(value), low: to(low), high: to(high) };
  return distanceFigure({ distance, regime: member.regime, unit: document.unit, form: "value", language }).text;
}

function ringsOf(document: SceneDocument, scale: RadialScale, distancesPc: number[], language: Language) {
  if (document.rings === "none" || distancesPc.length === 0) return { rings: [], ringRatio: null };
  const { unit } = document;
  const nearest = distancesPc.reduce((least, pc) => Math.min(least, pc));
  const farthest = distancesPc.reduce((most, pc) => Math.max(most, pc));
  const [least, most] = [convertLength(nearest, "pc", unit), convertLength(farthest, "pc", unit)];
  const { lengths, ratio } =
    document.mapping === "linear" ? { lengths: evenLengths(most), ratio: null } : stretchedLengths(least, most);
  const rings = lengths.map((length) => ({
    radius: radiusOf(scale, convertLength(length, unit, "pc")),
    label: scaleSymbolText(length, unit, language),
  }));
  return { rings, ringRatio: ratio };
}

function scaleBarOf(document: SceneDocument, farthestPc: number, language: Language) {
  const length = roundLengthBelow(convertLength(farthestPc, "pc", document.unit) / 3);
  return { length: convertLength(length, document.unit, "pc"), label: scaleText(length, document.unit, language) };
}
