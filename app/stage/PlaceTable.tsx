import type { ReactNode } from "react";
import { icrsToGalactic } from "#app/astrometry/coordinates.ts";
import type { Language } from "#app/figures/language.ts";
import { degreesText } from "#app/figures/office-numbers.ts";
import type { SceneDocument } from "#app/scene/document.ts";
import { layoutVolume } from "#app/scene/layout.ts";
import type { CastMember } from "#app/scene/member.ts";
import { STAGE_WORDS } from "./words.ts";

interface PlaceTableProps {
  document: SceneDocument;
  members: readonly CastMember[];
  language: Language;
  className?: string;
}

const CELL = "py-1.5 pr-4 text-left align-baseline font-normal";

/** What the picture shows, in words: who is where, the nearest first, and who has no place in it. */
export function PlaceTable({ document, members, language, className = "" }: PlaceTableProps) {
  const { table, regimes } = STAGE_WORDS[language];
  const layout = layoutVolume(document, members, language);
  const kept = new Map(members.map((member) => [member.recordId, member]));
  const distance = (recordId: string) => kept.get(recordId)?.distancePc?.value ?? 0;
  const nearestFirst = [...layout.stars].sort((a, b) => distance(a.recordId) - distance(b.recordId));
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
          {nearestFirst.map(({ recordId, name, distanceText, regime }) => (
            <Row key={recordId} name={name}>
              <td className={CELL}>{distanceText}</td>
              <DirectionCells member={kept.get(recordId)} language={language} />
              <td className={CELL}>{regimes[regime]}</td>
            </Row>
          ))}
          {layout.missing.map(({ recordId, name, reason }) => (
            <Row key={recordId} name={name}>
              <td className={CELL} colSpan={4}>
                {reason}
              </td>
            </Row>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Row({ name, children }: { name: string; children: ReactNode }) {
  return (
    <tr className="border-rule border-b">
      <th scope="row" className={CELL}>
        {name}
      </th>
      {children}
    </tr>
  );
}

function DirectionCells({ member, language }: { member: CastMember | undefined; language: Language }) {
  if (!member || member.raDeg === null || member.decDeg === null) return <td className={CELL} colSpan={2} />;
  const { lDeg, bDeg } = icrsToGalactic(member.raDeg, member.decDeg);
  return (
    <>
      <td className={CELL}>{degreesText(lDeg, language, 1)}</td>
      <td className={CELL}>{degreesText(bDeg, language, 1)}</td>
    </>
  );
}
