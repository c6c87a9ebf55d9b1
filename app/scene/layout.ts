import { galacticXyz } from "#app/astrometry/coordinates.ts";
import { convertLength } from "#app/astrometry/units.ts";
import type { Language } from "#app/figures/language.ts";
import { distanceFigure } from "#app/figures/range-figure.ts";
import { scaleSymbolText, scaleText } from "#app/figures/scale-text.ts";
import { claimsOf, type SceneClaims } from "./claims.ts";
import type { SceneDocument } from "./document.ts";
import type { SceneMember } from "./member.ts";
import { type RadialScale, radiusOf, scaleFor } from "./radial-scale.ts";
import { decadeLengths, evenLengths, roundLengthBelow } from "./round-lengths.ts";
import { type Rgb, starColour, starSizePx } from "./star-look.ts";

export type { SceneMember } from "./member.ts";
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
  /** Circles around the Sun in the Galactic plane. */
  rings: { radius: number; label: string }[];
  /** A round length near the Sun; null where the scale is not linear. */
  scaleBar: { length: number; label: string } | null;
  /** Radius of the cast, scene units: the camera's distance is counted in it. */
  extent: number;
  claims: SceneClaims;
}

const SUN: Record<Language, string> = { en: "Sun", fr: "Soleil" };

/** The far end of a range may lie at infinity; it is drawn to this many times the value. */
const FARTHEST = 4;

/**
 * Places a cast around the Sun.
 * @param members every one with a finite distance above zero
 * @throws RangeError when a distance is not
 */
export function layoutVolume(document: SceneDocument, members: SceneMember[], language: Language = "en"): VolumeLayout {
  const distances = members.map((member) => member.distancePc.value);
  const scale = scaleFor(document.mapping, distances);
  const farthest = Math.max(...distances, 1e-6);
  return {
    stars: members.map((member) => placeStar(document, scale, member, language)),
    sun: { name: SUN[language], colour: starColour(null), sizePx: 3 },
    rings: document.rings === "none" ? [] : ringsOf(document, scale, distances, language),
    scaleBar: document.mapping === "linear" ? scaleBarOf(document, farthest, language) : null,
    extent: radiusOf(scale, farthest),
    claims: claimsOf(document),
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
    low: place(Math.max(low, 0)),
    high: place(Math.min(high, value * FARTHEST)),
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
  if (distancesPc.length === 0) return [];
  const { unit } = document;
  const nearest = convertLength(Math.min(...distancesPc), "pc", unit);
  const farthest = convertLength(Math.max(...distancesPc), "pc", unit);
  const lengths = document.mapping === "linear" ? evenLengths(farthest) : decadeLengths(nearest, farthest);
  return lengths.map((length) => ({
    radius: radiusOf(scale, convertLength(length, unit, "pc")),
    label: scaleSymbolText(length, unit, language),
  }));
}

function scaleBarOf(document: SceneDocument, farthestPc: number, language: Language) {
  const length = roundLengthBelow(convertLength(farthestPc, "pc", document.unit) / 3);
  return { length: convertLength(length, document.unit, "pc"), label: scaleText(length, document.unit, language) };
}
