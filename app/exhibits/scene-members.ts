import type { CastMember } from "#app/scene/member.ts";
import type { SceneContent } from "./content.ts";

/** The cast as the stage wants it; who has no place is told there with the reason. */
export function sceneMembers(scene: SceneContent, language: "en" | "fr"): CastMember[] {
  return scene.cast.map(({ recordId, name, labelled, raDeg, decDeg, distancePc, regime, bv, vMag }) => ({
    recordId,
    name: name[language] ?? name.en,
    labelled,
    raDeg,
    decDeg,
    distancePc,
    regime,
    bv,
    vMag,
  }));
}
