import { icrsToGalactic } from "#app/astrometry/coordinates.ts";
import type { Language } from "#app/figures/language.ts";
import { degreesText } from "#app/figures/office-numbers.ts";
import type { SceneDocument } from "#app/scene/document.ts";
import { layoutVolume } from "#app/scene/layout.ts";
import type { SceneMember } from "#app/scene/member.ts";
import { STAGE_WORDS } from "./words.ts";

interface PlaceTableProps {
  document: SceneDocument;
  members: SceneMember[];
  language: Language;
  className?: string;
}

/** What the picture shows, in words: who is where, the nearest first. */
export function PlaceTable({ document, members, language, className = "" }: PlaceTableProps) {
  const { table, regimes } = STAGE_WORDS[language];
  const distances = new Map(
    layoutVolume(document, members, language).stars.map((star) => [star.recordId, star.distanceText]),
  );
  const ordered = [...members].sort((a, b) => a.distancePc.value - b.distancePc.value);
  const cell = "py-1.5 pr-4 text-left align-baseline font-normal";
  return (
    <div className={`overflow-x-auto ${className}`}>
      <table className="w-full border-collapse text-sm">
        <caption className="label pb-1 text-left">{table.caption}</caption>
        <thead>
          <tr className="border-rule border-b">
            {[table.name, table.distance, table.longitude, table.latitude, table.kind].map((head) => (
              <th key={head} scope="col" className="label py-1.5 pr-4 text-left align-bottom">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {ordered.map((member) => {
            const { lDeg, bDeg } = icrsToGalactic(member.raDeg, member.decDeg);
            return (
              <tr key={member.recordId} className="border-rule border-b">
                <th scope="row" className={cell}>
                  {member.name}
                </th>
                <td className={cell}>{distances.get(member.recordId)}</td>
                <td className={cell}>{degreesText(lDeg, language, 1)}</td>
                <td className={cell}>{degreesText(bDeg, language, 1)}</td>
                <td className={cell}>{regimes[member.regime]}</td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}
