import type { SceneMember } from "#app/scene/layout.ts";
import type { SceneContent } from "./content.ts";

/** The cast as the stage wants it. Members without a position or a distance cannot be placed and are left out. */
export function sceneMembers(scene: SceneContent, language: "en" | "fr"): SceneMember[] {
  return scene.cast.flatMap((member) => {
    const { raDeg, decDeg, distancePc, regime } = member;
    if (raDeg === null || decDeg === null || !distancePc || !regime) return [];
    const name = member.name[language] ?? member.name.en;
    return [
      {
        recordId: member.recordId,
        name,
        raDeg,
        decDeg,
        distancePc,
        regime,
        bv: member.bv,
        vMag: member.vMag,
        labelled: member.labelled,
      },
    ];
  });
}
