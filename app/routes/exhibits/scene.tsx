import { useState } from "react";
import { Form, Link, useSearchParams } from "react-router";
import { readRecordChoices } from "#app/catalogue/read-records.server.ts";
import { readScene } from "#app/exhibits/read-scene.server.ts";
import { sceneMembers } from "#app/exhibits/scene-members.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { claimsSentence } from "#app/scene/claims.ts";
import type { SceneDocument } from "#app/scene/document.ts";
import type { Orbit } from "#app/stage/camera.ts";
import { PlaceTable } from "#app/stage/PlaceTable.tsx";
import { VolumeStage } from "#app/stage/VolumeStage.tsx";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import type { PageHandle } from "#app/ui/page-handle.ts";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { Tabs } from "#app/ui/Tabs.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import type { Route } from "./+types/scene";
import { CastList } from "./CastList.tsx";
import { CheckList } from "./CheckList.tsx";
import { PicturePanel } from "./PicturePanel.tsx";
import { ScalePanel } from "./ScalePanel.tsx";
import { actOnScene } from "./scene-action.server.ts";
import { WordsPanel } from "./WordsPanel.tsx";
import { EXHIBIT_STATE } from "./words.ts";

export const handle: PageHandle = { bleed: true };

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.scene.titleEn ?? "Scene"} · Alidade` },
];

export const loader = answered(async ({ context, params }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  const [page, records] = await Promise.all([readScene(actor, params.exhibit, params.scene), readRecordChoices(actor)]);
  return { ...page, records, mayWrite: mayDo(actor.roles, "exhibit.write") };
});

export const shouldRevalidate = readAgainAfterConflict;

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) =>
  actOnScene(requireActor(context), await readForm(request), params, new URL(request.url)),
);

const PANELS = ["scale", "words", "picture", "checks"] as const;
const PANEL_WORDS = { scale: "Scale", words: "Words", picture: "Picture", checks: "Checks" };

export default function Scene({ loaderData, actionData }: Route.ComponentProps) {
  const { exhibit, scene, scenes, resolved, checks, mayWrite } = loaderData;
  const [query] = useSearchParams();
  const panel = PANELS.find((one) => one === query.get("tab")) ?? "scale";
  const [selectedId, select] = useState<string | null>(null);
  // What the scale panel is set to, before it is saved: the stage shows it at once.
  const [tried, setTried] = useState<{ for: number; document: SceneDocument } | null>(null);
  const [view, setView] = useState<Orbit | null>(null);
  const document = tried?.for === scene.version ? tried.document : resolved.document;
  const members = sceneMembers(resolved, "en");
  const state = EXHIBIT_STATE[exhibit.state];
  return (
    <div className="grid min-h-dvh grid-rows-[auto_1fr_auto]">
      <header className="flex flex-wrap items-baseline gap-x-5 gap-y-1 border-b border-ink px-6 py-4">
        <div>
          <p className="text-sm text-ink-soft">
            <Link to={`/exhibits/${exhibit.id}`} className="link">
              {exhibit.titleEn}
            </Link>
            , scene {scene.number} of {scenes.length}
          </p>
          <h1 className="text-2xl">{scene.titleEn}</h1>
        </div>
        <div className="flex flex-wrap items-center gap-4 md:ml-auto">
          <StateMark tone={state.tone}>{state.word}</StateMark>
          {mayWrite ? <RemoveScene {...loaderData} /> : null}
        </div>
      </header>
      <div className="grid lg:grid-cols-[20rem_1fr] xl:grid-cols-[20rem_1fr_23rem]">
        <section aria-label="Cast" className="border-rule px-6 py-5 max-lg:order-2 lg:border-r">
          <CastList {...loaderData} actionData={actionData} selectedId={selectedId} onSelect={select} />
        </section>
        <section
          aria-label="Stage"
          className="night flex min-h-[26rem] flex-col max-lg:order-1 max-lg:h-[70dvh] lg:sticky lg:top-0 lg:h-dvh lg:max-h-[60rem]"
        >
          <VolumeStage
            document={document}
            members={members}
            language="en"
            stillUrl={`/exhibits/${exhibit.id}/scenes/${scene.id}/still.png?v=${scene.version}`}
            stillAlt={`${scene.titleEn}. The table below says who is where.`}
            selectedId={selectedId}
            onSelect={select}
            onView={setView}
            className="min-h-[26rem] grow"
          />
        </section>
        <section
          aria-label="Panels"
          className="border-rule px-6 py-5 max-lg:order-3 lg:col-span-2 lg:border-t xl:col-span-1 xl:border-t-0 xl:border-l"
        >
          <Tabs
            label="Panels"
            tabs={PANELS.map((one) => ({
              to: `?tab=${one}`,
              label: PANEL_WORDS[one],
              current: one === panel,
              count: one === "checks" && checks.length > 0 ? String(checks.length) : undefined,
            }))}
          />
          <FormErrors errors={actionData?.problem.errors} />
          {panel === "scale" ? (
            <ScalePanel
              {...loaderData}
              key={scene.version}
              actionData={actionData}
              view={view}
              onTry={(next) => setTried({ for: scene.version, document: next })}
            />
          ) : null}
          {panel === "words" ? <WordsPanel {...loaderData} key={scene.version} actionData={actionData} /> : null}
          {panel === "picture" ? <PicturePanel {...loaderData} /> : null}
          {panel === "checks" ? <CheckList checks={checks} /> : null}
        </section>
      </div>
      <footer className="border-t border-ink px-6 py-4">
        <p className="mb-2 text-sm">{claimsSentence(resolved.claims, "en")}</p>
        <Disclosure summary="Who is where, as a table">
          <PlaceTable document={document} members={members} language="en" />
        </Disclosure>
        <ScenesRow exhibitId={exhibit.id} scenes={scenes} here={scene.id} />
      </footer>
    </div>
  );
}

type Data = Route.ComponentProps["loaderData"];

function ScenesRow({ exhibitId, scenes, here }: { exhibitId: string; scenes: Data["scenes"]; here: string }) {
  return (
    <nav aria-label="Scenes" className="mt-4">
      <ol className="flex flex-wrap">
        {scenes.map((one, at) => (
          <li key={one.id} className={one.id === here ? "bg-paper-shade" : undefined}>
            <Link
              to={`/exhibits/${exhibitId}/scenes/${one.id}`}
              aria-current={one.id === here ? "page" : undefined}
              className="block min-w-44 border-r border-rule px-4 py-3 no-underline hover:bg-paper-shade"
            >
              <span className="label block">{at + 1}</span>
              <span className="font-head">{one.title}</span>
            </Link>
          </li>
        ))}
      </ol>
    </nav>
  );
}

function RemoveScene({ exhibit, scene }: Data) {
  return (
    <Form method="post" action={`/exhibits/${exhibit.id}`}>
      <input type="hidden" name="sceneId" value={scene.id} />
      <input type="hidden" name="version" value={scene.version} />
      <SubmitButton intent="remove-scene" look="plain" pending="Removing…">
        Remove this scene
      </SubmitButton>
    </Form>
  );
}
