import { useCallback, useEffect, useState } from "react";
import { Link, type ShouldRevalidateFunctionArgs, useRevalidator, useSearchParams } from "react-router";
import { sceneMembers } from "#app/exhibits/scene-members.ts";
import { answered } from "#app/http.server.ts";
import { readKioskPage } from "#app/kiosks/read-kiosk-page.server.ts";
import { creditText } from "#app/media/licence-words.ts";
import { claimsSentence } from "#app/scene/claims.ts";
import { PlaceTable } from "#app/stage/PlaceTable.tsx";
import { VolumeStage } from "#app/stage/VolumeStage.tsx";
import { Picture } from "#app/ui/Picture.tsx";
import type { PageHandle } from "#app/ui/page-handle.ts";
import type { Route } from "./+types/kiosk";
import { HowWeKnow } from "./HowWeKnow.tsx";
import { NightDialog } from "./NightDialog.tsx";
import { SceneWords } from "./SceneWords.tsx";
import { StarCard } from "./StarCard.tsx";
import { useIdle } from "./use-idle.ts";
import { useNewEdition } from "./use-new-edition.ts";
import { KIOSK_WORDS, type KioskLanguage } from "./words.ts";

export const handle: PageHandle = { ground: "night", bleed: true };

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: loaderData?.edition?.content.title.en ?? loaderData?.kiosk.name ?? "Kiosk" },
];

export const loader = answered(async ({ params, request }: Route.LoaderArgs) => {
  const page = await readKioskPage(params.kiosk);
  const asked = new URL(request.url).searchParams.get("lang");
  const language: KioskLanguage = asked === "en" || asked === "fr" ? asked : page.kiosk.language;
  return { ...page, language };
});

/** Going from scene to scene asks nobody: a kiosk without a network goes on. Only a new edition loads again. */
export function shouldRevalidate({ currentUrl, nextUrl, defaultShouldRevalidate }: ShouldRevalidateFunctionArgs) {
  return currentUrl.href === nextUrl.href ? defaultShouldRevalidate : currentUrl.pathname !== nextUrl.pathname;
}

export default function Kiosk({ loaderData }: Route.ComponentProps) {
  const { kiosk, exhibit, edition } = loaderData;
  const [query, setQuery] = useSearchParams();
  const [resets, setResets] = useState(0);
  const revalidator = useRevalidator();
  const startAgain = useCallback(() => {
    setResets((count) => count + 1);
    setQuery({}, { replace: true, preventScrollReset: true });
  }, [setQuery]);
  const [turned, setTurned] = useState(false);
  const { warning, isIdle, stay } = useIdle(kiosk.idleSeconds, query.size > 0 || turned, startAgain);
  const isNew = useNewEdition(exhibit, edition?.number ?? null);
  const language = languageOf(query, loaderData);
  // biome-ignore lint/correctness/useExhaustiveDependencies: a reset forgets that the stage was turned
  useEffect(() => setTurned(false), [resets]);
  useEffect(() => {
    document.documentElement.lang = language;
  }, [language]);
  // A new edition is taken only while nobody is here.
  useEffect(() => {
    if (isNew && isIdle && revalidator.state === "idle") void revalidator.revalidate();
  }, [isNew, isIdle, revalidator]);
  useKioskWithoutExhibit(edition === null, revalidator);
  const words = KIOSK_WORDS[language];
  if (!edition) return <Resting words={words} name={kiosk.name} />;
  return (
    <>
      <Shown
        key={edition.digest}
        edition={edition}
        language={language}
        resets={resets}
        startAgain={startAgain}
        onTurn={() => setTurned(true)}
      />
      {warning === null ? null : (
        <NightDialog title={words.stillThere} onClose={stay}>
          <p className="mb-6 text-lg" role="timer">
            {words.restarts(warning)}
          </p>
          <button type="button" onClick={stay} className="target-mm-14 border-2 border-ink px-6 font-head text-lg">
            {words.here}
          </button>
        </NightDialog>
      )}
    </>
  );
}

type Data = Route.ComponentProps["loaderData"];
type Edition = NonNullable<Data["edition"]>;

function languageOf(query: URLSearchParams, { kiosk, edition }: Data): KioskLanguage {
  const asked = query.get("lang") ?? kiosk.language;
  return asked === "fr" && edition?.content.languages.includes("fr") ? "fr" : "en";
}

const LOOK_AGAIN_MS = 15_000;

/** A kiosk that rests looks now and then whether it was given something to show. */
function useKioskWithoutExhibit(rests: boolean, revalidator: ReturnType<typeof useRevalidator>): void {
  useEffect(() => {
    if (!rests) return;
    const timer = setInterval(() => void revalidator.revalidate(), LOOK_AGAIN_MS);
    return () => clearInterval(timer);
  }, [rests, revalidator]);
}

function Resting({ words, name }: { words: (typeof KIOSK_WORDS)[KioskLanguage]; name: string }) {
  return (
    <main id="main" className="grid min-h-dvh place-content-center gap-4 p-10 text-center">
      <h1 className="text-4xl">{words.rests}</h1>
      <p className="text-xl text-ink-soft">{words.restsWhy}</p>
      <p className="label">{name}</p>
    </main>
  );
}

interface ShownProps {
  edition: Edition;
  language: KioskLanguage;
  resets: number;
  startAgain: () => void;
  onTurn: () => void;
}

function Shown({ edition, language, resets, startAgain, onTurn }: ShownProps) {
  const [query, setQuery] = useSearchParams();
  const [asks, setAsks] = useState(false);
  const { content, stills } = edition;
  const words = KIOSK_WORDS[language];
  const at = Math.min(Math.max(Number(query.get("scene") ?? 1) || 1, 1), content.scenes.length) - 1;
  const scene = content.scenes[at];
  if (!scene) return <Resting words={words} name={content.title.en} />;
  const selected = scene.cast.find((one) => one.recordId === query.get("star"));
  const members = sceneMembers(scene, language);
  const select = (recordId: string | null) => {
    const next = new URLSearchParams(query);
    if (recordId) next.set("star", recordId);
    else next.delete("star");
    setQuery(next, { replace: true, preventScrollReset: true });
  };
  const title = scene.title[language] ?? scene.title.en;
  const digest = stills[`${scene.id}:${language}`];
  return (
    <main id="main" tabIndex={-1} className="grid min-h-dvh grid-rows-[auto_1fr_auto] outline-none">
      <header className="px-8 pt-8 pb-3">
        <p className="label">{content.title[language] ?? content.title.en}</p>
        <h1 className="text-3xl md:text-4xl">{title}</h1>
      </header>
      <div className="grid landscape:grid-cols-[3fr_2fr] portrait:grid-rows-[minmax(24rem,1fr)_auto]">
        <div className="flex min-h-96 flex-col">
          <VolumeStage
            key={scene.id}
            document={scene.document}
            members={members}
            language={language}
            stillUrl={digest ? `/stills/${digest}.png` : null}
            stillAlt={title}
            selectedId={selected?.recordId ?? null}
            onSelect={select}
            onView={onTurn}
            resetKey={resets}
            controls="kiosk"
            className="grow"
          />
          <p className="sr-only">{claimsSentence(scene.claims, language)}</p>
        </div>
        <div className="grid content-start gap-8 border-rule px-8 py-6 landscape:border-l portrait:grid-cols-2 portrait:border-t">
          <StarCard member={selected} language={language} onHow={() => setAsks(true)} />
          <div>
            <SceneWords scene={scene} language={language} />
            {scene.picture ? (
              <Picture
                sources={edition.pictures[scene.picture.digest] ?? []}
                alt={scene.picture.alt[language] ?? scene.picture.alt.en}
                width={scene.picture.width}
                height={scene.picture.height}
                sizes="40vw"
                credit={creditText(scene.picture, language)}
                className="mt-4 max-w-xl"
              />
            ) : null}
            <details className="mt-4">
              <summary className="target-mm-14 flex items-center font-head underline">{words.table}</summary>
              <PlaceTable document={scene.document} members={members} language={language} />
            </details>
          </div>
        </div>
      </div>
      <KioskBar edition={edition} language={language} at={at} startAgain={startAgain} />
      {asks && selected ? <HowWeKnow member={selected} language={language} onClose={() => setAsks(false)} /> : null}
    </main>
  );
}

interface KioskBarProps {
  edition: Edition;
  language: KioskLanguage;
  at: number;
  startAgain: () => void;
}

const BAR_ITEM =
  "target-mm-14 flex grow basis-36 flex-col items-center justify-center border-r border-rule px-4 py-3 text-center font-head text-lg no-underline last:border-r-0";

/** Within reach, at the bottom: the scenes, the other language, and the way back to the start. */
function KioskBar({ edition, language, at, startAgain }: KioskBarProps) {
  const [query] = useSearchParams();
  const words = KIOSK_WORDS[language];
  const { content } = edition;
  const other = language === "en" ? "fr" : "en";
  const to = (change: Record<string, string>) => {
    const next = new URLSearchParams(query);
    for (const [name, value] of Object.entries(change)) next.set(name, value);
    return `?${next}`;
  };
  const sceneTo = (number: number) => {
    const next = new URLSearchParams(query);
    next.delete("star");
    next.set("scene", String(number));
    return `?${next}`;
  };
  return (
    <nav aria-label={words.scenes} className="border-t border-rule">
      <div className="flex flex-wrap">
        {content.scenes.map((scene, index) => (
          <Link
            key={scene.id}
            to={sceneTo(index + 1)}
            replace
            preventScrollReset
            aria-current={index === at ? "page" : undefined}
            className={`${BAR_ITEM} ${index === at ? "bg-paper-shade" : ""}`}
          >
            <span className="label">{index + 1}</span>
            {scene.title[language] ?? scene.title.en}
          </Link>
        ))}
        {content.languages.includes("fr") ? (
          <Link to={to({ lang: other })} replace preventScrollReset lang={other} className={BAR_ITEM}>
            {words.otherLanguage}
          </Link>
        ) : null}
        <button type="button" onClick={startAgain} className={BAR_ITEM}>
          {words.startAgain}
        </button>
      </div>
      <p className="px-8 py-1 text-xs text-ink-soft">
        {words.edition(edition.number)} · <code>{edition.digest.slice(0, 8)}</code>
      </p>
    </nav>
  );
}
