import { Link } from "react-router";
import { icrsToGalactic } from "#app/astrometry/coordinates.ts";
import { degreesText, epochText } from "#app/figures/office-numbers.ts";
import { declinationText, rightAscensionText } from "#app/figures/sexagesimal-text.ts";
import { DefinitionList } from "#app/ui/DefinitionList.tsx";

interface PositionListProps {
  record: {
    raText: string | null;
    decText: string | null;
    raDeg: number | null;
    decDeg: number | null;
    positionEpoch: string | null;
    positionLocator: string | null;
    positionNote: string | null;
  };
  source: { id: string; citation: string } | null;
}

export function PositionList({ record, source }: PositionListProps) {
  const { raDeg, decDeg } = record;
  if (raDeg === null || decDeg === null) return null;
  const { lDeg, bDeg } = icrsToGalactic(raDeg, decDeg);
  return (
    <section>
      <h2 className="mb-2">Where it stands</h2>
      <DefinitionList
        items={[
          {
            term: "Right ascension",
            value: rightAscensionText(raDeg, "en"),
            note: `as printed “${record.raText}”`,
          },
          { term: "Declination", value: declinationText(decDeg, "en"), note: `as printed “${record.decText}”` },
          {
            term: "Frame, epoch",
            value: `ICRS, ${record.positionEpoch ? epochText(record.positionEpoch) : "no epoch yet"}`,
          },
          { term: "Galactic l, b", value: `${degreesText(lDeg, "en", 4)}, ${degreesText(bDeg, "en", 4)}` },
          {
            term: "Source",
            value: source ? (
              <Link to={`/sources/${source.id}`} className="link">
                {source.citation}
              </Link>
            ) : (
              "none yet"
            ),
            note: [record.positionLocator, record.positionNote].filter(Boolean).join(", ") || undefined,
          },
        ]}
      />
    </section>
  );
}
