import { Link } from "react-router";
import type { CastContent, SceneContent } from "#app/exhibits/content.ts";
import { sceneMembers } from "#app/exhibits/scene-members.ts";
import { measurementText } from "#app/figures/office-numbers.ts";
import { claimsSentence } from "#app/scene/claims.ts";
import { uncertainOrder } from "#app/scene/depth-order.ts";
import { partCast } from "#app/scene/missing.ts";
import { StateMark } from "#app/ui/StateMark.tsx";
import { type Column, Table } from "#app/ui/Table.tsx";
import { ReadWords } from "../exhibits/ReadWords.tsx";
import { REGIME_WORDS } from "../stars/words.ts";

interface ReviewSceneProps {
  exhibitId: string;
  scene: SceneContent;
  number: number;
  languages: readonly ("en" | "fr")[];
}

/** One scene as it will be signed: the picture, the words, and every number with what it rests on. */
export function ReviewScene({ exhibitId, scene, number, languages }: ReviewSceneProps) {
  const pairs = uncertainOrder(partCast(sceneMembers(scene, "en"), "en").placed);
  return (
    <section className="border-t border-ink pt-4">
      <h2 className="text-xl">
        <span className="num mr-3 text-ink-soft">{number}</span>
        {scene.title.en}
      </h2>
      {scene.title.fr ? (
        <p lang="fr" className="text-ink-soft">
          {scene.title.fr}
        </p>
      ) : null}
      <div className="mt-4 grid gap-8 lg:grid-cols-2">
        <figure>
          <img
            src={`/exhibits/${exhibitId}/scenes/${scene.id}/still.png`}
            alt={`${scene.title.en} as it is drawn; the table below has every place.`}
            width={1280}
            height={720}
            loading="lazy"
            className="w-full bg-night"
          />
          <figcaption className="mt-1 text-sm">{claimsSentence(scene.claims, "en")}</figcaption>
          {pairs.length > 0 ? (
            <p className="mt-1 text-sm text-vermilion">
              Which is nearer is not known of {pairs.map(([near, far]) => `${near} and ${far}`).join("; ")}.
            </p>
          ) : null}
        </figure>
        <div>
          {languages.map((language) => (
            <ReadWords key={language} scene={scene} language={language} className="mb-6" />
          ))}
          {scene.picture ? (
            <p className="text-sm text-ink-soft">
              Picture: {scene.picture.alt.en} {scene.picture.creditLine} ({scene.picture.licence})
            </p>
          ) : null}
        </div>
      </div>
      <Table
        caption={`Every number of scene ${number}`}
        captionHidden
        className="mt-6"
        rows={scene.cast}
        rowKey={(row) => row.recordId}
        columns={COLUMNS}
      />
    </section>
  );
}

const COLUMNS: Column<CastContent>[] = [
  {
    id: "name",
    head: "Star",
    rowHead: true,
    cell: (row) => (
      <Link to={`/stars/${row.recordId}`} className="link">
        {row.name.en}
      </Link>
    ),
  },
  { id: "reads", head: "Reads", numeric: true, cell: (row) => row.distance?.en.text ?? "nothing" },
  {
    id: "range",
    head: "68 % range",
    numeric: true,
    cell: (row) => (row.distance ? `${row.distance.en.low} to ${row.distance.en.high} ${row.distance.en.unit}` : ""),
  },
  {
    id: "parallax",
    head: "Parallax",
    numeric: true,
    cell: (row) =>
      row.parallax ? (
        <>
          {measurementText({ ...row.parallax, language: "en" })}
          <div className="text-sm text-ink-soft">printed “{row.parallax.raw}”</div>
        </>
      ) : null,
  },
  { id: "regime", head: "Regime", cell: (row) => (row.regime ? REGIME_WORDS[row.regime] : "") },
  {
    id: "source",
    head: "Source",
    cell: (row) => (
      <>
        {row.source?.citation ?? <StateMark tone="person">needs a source</StateMark>}
        <div className="break-all text-sm text-ink-soft">{row.source?.bibcode ?? row.source?.doi}</div>
      </>
    ),
  },
  {
    id: "vetted",
    head: "Record",
    cell: (row) => (
      <StateMark tone={row.vetted ? "vetted" : "person"}>{row.vetted ? "vetted" : "not vetted"}</StateMark>
    ),
  },
];
