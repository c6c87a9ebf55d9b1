import { Form, Link, redirect, useFetcher } from "react-router";
import { Invalid } from "#app/errors.ts";
import { addScene } from "#app/exhibits/add-scene.server.ts";
import { AddScene, OrderScenes, RemoveScene, RenameExhibit } from "#app/exhibits/exhibit-input.ts";
import { movedInOrder } from "#app/exhibits/order.ts";
import { orderScenes } from "#app/exhibits/order-scenes.server.ts";
import { removeScene } from "#app/exhibits/remove-scene.server.ts";
import { renameExhibit } from "#app/exhibits/rename-exhibit.server.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { authorise } from "#app/people/authorise.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { readReview } from "#app/review/read-review.server.ts";
import { SignStep, TakeBackStep } from "#app/review/step-input.ts";
import { submitExhibit } from "#app/review/submit-exhibit.server.ts";
import { takeBack } from "#app/review/take-back.server.ts";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { Field } from "#app/ui/Field.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { SortableList } from "#app/ui/SortableList.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import { formState } from "../form-state.ts";
import type { Route } from "./+types/exhibit";
import { CheckList } from "./CheckList.tsx";
import { MoveButtons } from "./MoveButtons.tsx";
import { SealHistory } from "./SealHistory.tsx";
import { EXHIBIT_STATE } from "./words.ts";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.exhibit.titleEn ?? "Exhibit"} · Alidade` },
];

export const loader = answered(async ({ context, params, request }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  const review = await readReview(actor, params.exhibit);
  return {
    ...review,
    mayWrite: mayDo(actor.roles, "exhibit.write"),
    said: new URL(request.url).searchParams.get("said"),
  };
});

export const shouldRevalidate = readAgainAfterConflict;

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  const actor = requireActor(context);
  const form = await readForm(request);
  const back = (said: string) => redirect(`/exhibits/${params.exhibit}?said=${said}`);
  switch (form.get("intent")) {
    case "rename":
      await renameExhibit(actor, parseInput(RenameExhibit, form));
      return back("kept");
    case "add-scene": {
      const sceneId = await addScene(actor, parseInput(AddScene, form));
      return redirect(`/exhibits/${params.exhibit}/scenes/${sceneId}`);
    }
    case "remove-scene":
      await removeScene(actor, parseInput(RemoveScene, form));
      return back("removed");
    case "order-scenes":
      await orderScenes(actor, parseInput(OrderScenes, form));
      return back("ordered");
    case "move-scene": {
      authorise(actor, "exhibit.write");
      const { content } = await readReview(actor, params.exhibit);
      const ids = content.scenes.map((one) => one.id);
      const order = movedInOrder(ids, String(form.get("sceneId")), form.get("by") === "-1" ? -1 : 1);
      await orderScenes(
        actor,
        parseInput(OrderScenes, { exhibitId: params.exhibit, version: form.get("version"), order }),
      );
      return back("ordered");
    }
    case "submit":
      await submitExhibit(actor, parseInput(SignStep, form));
      return back("submitted");
    case "take-back":
      await takeBack(actor, parseInput(TakeBackStep, form));
      return back("taken-back");
    default:
      throw new Invalid({ "": ["This page cannot do that."] });
  }
});

const SAID: Record<string, string> = {
  kept: "Kept.",
  removed: "The scene is removed.",
  ordered: "The scenes are in their new order.",
  submitted: "Submitted. The scientists have mail.",
  "taken-back": "It is yours again. The seals have ended.",
};

export default function Exhibit({ loaderData, actionData }: Route.ComponentProps) {
  const { exhibit, said, checks, content, seals } = loaderData;
  const { word, tone } = EXHIBIT_STATE[exhibit.state];
  const form = formState(actionData);
  return (
    <>
      <PageHead
        title={exhibit.titleEn}
        crumbs={[{ label: "Exhibits", to: "/exhibits" }]}
        subtitle={exhibit.titleFr ?? undefined}
        state={
          <StateMark tone={tone} large>
            {word}
          </StateMark>
        }
        actions={
          <>
            <LinkButton look="quiet" to={`/reviews/${exhibit.id}`}>
              Review it
            </LinkButton>
            <LinkButton look="quiet" to={`/editions/${exhibit.id}`}>
              Editions
            </LinkButton>
          </>
        }
      />
      {said && SAID[said] && !actionData ? <Notice tone="success">{SAID[said]}</Notice> : null}
      <FormErrors errors={form.errors} />
      <div className="grid gap-14 lg:grid-cols-[3fr_2fr]">
        <div className="grid content-start gap-10">
          <Scenes {...loaderData} />
          <section>
            <h2 className="mb-3">Signed</h2>
            <SealHistory seals={seals} />
          </section>
        </div>
        <div className="grid content-start gap-10">
          <section>
            <h2 className="mb-3">Checks</h2>
            <CheckList
              checks={checks}
              sceneName={(id) => content.scenes.find((scene) => scene.id === id)?.title.en ?? ""}
            />
          </section>
          <Steps {...loaderData} />
          {loaderData.mayWrite ? <Rename exhibit={exhibit} actionData={actionData} /> : null}
          <p>
            <Link to={`/audit?type=exhibit&object=${exhibit.id}`} className="link">
              What happened to this exhibit
            </Link>
          </p>
        </div>
      </div>
    </>
  );
}

type Data = Route.ComponentProps["loaderData"];

function Scenes({ exhibit, content, mayWrite }: Data) {
  const fetcher = useFetcher();
  const items = content.scenes.map((scene) => ({ ...scene, name: scene.title.en }));
  const reorder = (order: string[]) => {
    const form = new FormData();
    form.set("intent", "order-scenes");
    form.set("exhibitId", exhibit.id);
    form.set("version", String(exhibit.version));
    for (const id of order) form.append("order", id);
    fetcher.submit(form, { method: "post" });
  };
  const refused = (fetcher.data as { problem?: { message: string } } | undefined)?.problem;
  return (
    <section>
      <h2 className="mb-3">Scenes</h2>
      {refused ? <Notice tone="error">{refused.message}</Notice> : null}
      {items.length === 0 ? <p className="text-ink-soft">No scene yet.</p> : null}
      <SortableList label="Scenes" items={items} onOrder={reorder} fixed={!mayWrite || items.length < 2}>
        {(scene, at) => (
          <div className="flex flex-wrap items-baseline gap-x-4">
            <span className="num label">{at + 1}</span>
            <Link to={`/exhibits/${exhibit.id}/scenes/${scene.id}`} className="link font-head text-lg">
              {scene.title.en}
            </Link>
            <span className="text-sm text-ink-soft">
              {scene.cast.length} in the cast, {Object.keys(scene.figures).length} figures
            </span>
            {mayWrite && items.length > 1 ? (
              <span className="ml-auto">
                <MoveButtons
                  name={scene.title.en}
                  intent="move-scene"
                  hidden={{ sceneId: scene.id, version: exhibit.version }}
                  first={at === 0}
                  last={at === items.length - 1}
                />
              </span>
            ) : null}
          </div>
        )}
      </SortableList>
      {mayWrite ? (
        <Form method="post" className="mt-6 grid max-w-words gap-4">
          <input type="hidden" name="exhibitId" value={exhibit.id} />
          <Field id="scene-titleEn" label="A new scene" name="titleEn" hint="Its title." required />
          {exhibit.titleFr ? <Field id="scene-titleFr" label="Its title in French" name="titleFr" lang="fr" /> : null}
          <SubmitButton intent="add-scene" look="quiet" pending="Adding…" className="justify-self-start">
            Add the scene
          </SubmitButton>
        </Form>
      ) : null}
    </section>
  );
}

function Steps({ exhibit, digest, checks, steps }: Data) {
  const blocked = checks.some((check) => check.level === "blocks");
  const hidden = (
    <>
      <input type="hidden" name="exhibitId" value={exhibit.id} />
      <input type="hidden" name="version" value={exhibit.version} />
    </>
  );
  if (steps.includes("submit")) {
    return (
      <section>
        <h2 className="mb-3">Send it to the scientist</h2>
        {blocked ? (
          <p className="text-ink-soft">It can be sent when nothing blocks any more.</p>
        ) : (
          <Form method="post" className="grid max-w-words gap-4">
            {hidden}
            <input type="hidden" name="digest" value={digest} />
            <TextArea id="submit-note" label="What they should know" name="note" rows={2} />
            <SubmitButton intent="submit" pending="Sending…" className="justify-self-start">
              Submit for verification
            </SubmitButton>
          </Form>
        )}
      </section>
    );
  }
  if (!steps.includes("take-back")) return null;
  return (
    <Disclosure summary="Take it back to work on it">
      <Form method="post" className="grid max-w-words gap-4">
        {hidden}
        <p className="text-ink-soft">Its seals end; its editions stay as they are.</p>
        <SubmitButton intent="take-back" look="danger" className="justify-self-start">
          Take it back
        </SubmitButton>
      </Form>
    </Disclosure>
  );
}

function Rename({ exhibit, actionData }: Pick<Data, "exhibit"> & { actionData: Route.ComponentProps["actionData"] }) {
  const form = formState(actionData, { titleEn: exhibit.titleEn, titleFr: exhibit.titleFr }, "rename");
  return (
    <Disclosure summary="Titles" open={Boolean(form.errors)}>
      <Form method="post" className="grid max-w-words gap-4">
        <input type="hidden" name="exhibitId" value={exhibit.id} />
        <input type="hidden" name="version" value={exhibit.version} />
        <Field
          label="Title"
          name="titleEn"
          defaultValue={form.value("titleEn")}
          error={form.error("titleEn")}
          required
        />
        <Field
          label="Title in French"
          name="titleFr"
          lang="fr"
          hint="Empty: English only."
          defaultValue={form.value("titleFr")}
          error={form.error("titleFr")}
        />
        <SubmitButton intent="rename" look="quiet" className="justify-self-start">
          Keep the titles
        </SubmitButton>
      </Form>
    </Disclosure>
  );
}
