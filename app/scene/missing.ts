import type { Language } from "#app/figures/language.ts";
import type { RangeNumbers } from "#app/figures/range-figure.ts";
import type { CastMember, SceneMember } from "./member.ts";

/** One of the cast that the picture cannot show, and why, in words. */
export interface MissingMember {
  recordId: string;
  name: string;
  reason: string;
}

type Reason = "position" | "prior" | "distance" | "range";

const REASONS: Record<Language, Record<Reason, string>> = {
  en: {
    position: "Its position on the sky is not known.",
    prior: "Its parallax alone gives no distance: a prior must be chosen, with a reason.",
    distance: "No distance has been adopted.",
    range: "Its distance has no usable range.",
  },
  fr: {
    position: "Sa position dans le ciel n’est pas connue.",
    prior: "Sa parallaxe seule ne donne pas de distance : il faut choisir un a priori, avec une raison.",
    distance: "Aucune distance n’a été adoptée.",
    range: "Sa distance n’a pas d’intervalle utilisable.",
  },
};

/**
 * Parts a cast into those with a place and those without. Nobody is dropped: every member is in exactly one of the two,
 * in the order of the cast.
 */
export function partCast(
  members: readonly CastMember[],
  language: Language,
): { placed: SceneMember[]; missing: MissingMember[] } {
  const placed: SceneMember[] = [];
  const missing: MissingMember[] = [];
  for (const member of members) {
    const reason = whyMissing(member);
    if (reason) missing.push({ recordId: member.recordId, name: member.name, reason: REASONS[language][reason] });
    else placed.push(member as SceneMember);
  }
  return { placed, missing };
}

function whyMissing({ raDeg, decDeg, distancePc, regime }: CastMember): Reason | null {
  if (!isDirection(raDeg, decDeg)) return "position";
  if (!distancePc) return regime === "prior-led" ? "prior" : "distance";
  if (!regime) return "distance";
  return isRange(distancePc) ? null : "range";
}

const isDirection = (raDeg: number | null, decDeg: number | null) =>
  Number.isFinite(raDeg) && Number.isFinite(decDeg) && Math.abs(decDeg ?? 0) <= 90;

const isRange = ({ value, low, high }: RangeNumbers) =>
  low >= 0 && low < value && value < high && Number.isFinite(high);
