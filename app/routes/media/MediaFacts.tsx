import { Link } from "react-router";
import type { readMediaUses } from "#app/exhibits/read-media-uses.server.ts";
import { plainNumber } from "#app/figures/office-numbers.ts";
import { LICENCE_WORDS } from "#app/media/licence-words.ts";
import type { readMedia } from "#app/media/read-media.server.ts";
import { DefinitionList } from "#app/ui/DefinitionList.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { Table } from "#app/ui/Table.tsx";
import { Time } from "#app/ui/Time.tsx";

type Kept = Awaited<ReturnType<typeof readMedia>>;

const KIND: Record<string, string> = {
  "image/jpeg": "JPEG",
  "image/png": "PNG",
  "image/webp": "WebP",
  "image/avif": "AVIF",
  "image/tiff": "TIFF",
};

/** What is known of a picture: who made it, under which terms it is shown, and what arrived. */
export function MediaFacts({ medium }: { medium: Kept }) {
  const size = `${plainNumber(medium.width, "en")} × ${plainNumber(medium.height, "en")} pixels`;
  const kilobytes = `${plainNumber(Math.ceil(medium.bytes / 1000), "en")} kB`;
  return (
    <DefinitionList
      items={[
        { term: "Creator", value: medium.creator },
        { term: "Licence", value: LICENCE_WORDS.en[medium.licence] },
        { term: "Read to those who do not see it", value: medium.altEn },
        {
          term: "The same in French",
          value: medium.altFr ? (
            <span lang="fr">{medium.altFr}</span>
          ) : (
            "none; an exhibit that is also in French needs one"
          ),
        },
        { term: "As it arrived", value: `${KIND[medium.mime] ?? medium.mime}, ${size}, ${kilobytes}` },
        {
          term: "Kept",
          value: (
            <>
              <Time at={medium.createdAt} /> by {medium.keptBy}
            </>
          ),
        },
        { term: "SHA-256 of the file", value: <span className="break-all text-sm">{medium.digest}</span> },
      ]}
    />
  );
}

/** The scenes that show a picture. */
export function MediaUses({ uses }: { uses: Awaited<ReturnType<typeof readMediaUses>> }) {
  if (uses.length === 0) return <p className="text-ink-soft">No scene shows this picture yet.</p>;
  return (
    <Table
      caption="Where this picture is shown"
      rows={uses}
      rowKey={(row) => row.sceneId}
      columns={[
        {
          id: "where",
          head: "Exhibit, scene",
          rowHead: true,
          cell: (row) => (
            <Link to={`/exhibits/${row.exhibitId}/scenes/${row.sceneId}`} className="link">
              {row.exhibit} / {row.scene}
            </Link>
          ),
        },
        { id: "state", head: "Exhibit is", cell: (row) => <StateMark tone="none">{row.state}</StateMark> },
      ]}
    />
  );
}
