import { Form, Link, redirect } from "react-router";
import { Invalid } from "#app/errors.ts";
import { answered, answeredAction, readForm } from "#app/http.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { mayDo } from "#app/people/permissions.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { approveExhibit } from "#app/review/approve-exhibit.server.ts";
import { readReview } from "#app/review/read-review.server.ts";
import { sendBack } from "#app/review/send-back.server.ts";
import { ReturnStep, SignStep } from "#app/review/step-input.ts";
import { verifyExhibit } from "#app/review/verify-exhibit.server.ts";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { FormErrors } from "#app/ui/FormErrors.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { readAgainAfterConflict } from "../after-conflict.ts";
import { CheckList } from "../exhibits/CheckList.tsx";
import { SealHistory } from "../exhibits/SealHistory.tsx";
import { EXHIBIT_STATE } from "../exhibits/words.ts";
import type { Route } from "./+types/review";
import { ReviewScene } from "./ReviewScene.tsx";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `Review ${loaderData?.exhibit.titleEn ?? ""} · Alidade` },
];

export const loader = answered(async ({ context, params, request }: Route.LoaderArgs) => {
  const actor = requireActor(context);
  return {
    ...(await readReview(actor, params.exhibit)),
    mayPublish: mayDo(actor.roles, "edition.publish"),
    said: new URL(request.url).searchParams.get("said"),
  };
});

export const shouldRevalidate = readAgainAfterConflict;

export const action = answeredAction(async ({ request, context, params }: Route.ActionArgs) => {
  const actor = requireActor(context);
  const form = await readForm(request);
  const back = (said: string) => redirect(`/reviews/${params.exhibit}?said=${said}`);
  switch (form.get("intent")) {
    case "verify":
      await verifyExhibit(actor, parseInput(SignStep, form));
      return back("verified");
    case "approve":
      await approveExhibit(actor, parseInput(SignStep, form));
      return back("approved");
    case "send-back":
      await sendBack(actor, parseInput(ReturnStep, form));
      return back("sent-back");
    default:
      throw new Invalid({ "": ["This page cannot do that."] });
  }
});

const SAID: Record<string, string> = {
  verified: "Verified and sealed. The publishers have mail.",
  approved: "Approved. It can be published now.",
  "sent-back": "Sent back. Its editors have mail.",
};

export default function Review({ loaderData, actionData }: Route.ComponentProps) {
  const { exhibit, content, checks, seals, digest, contributors, said } = loaderData;
  const { word, tone } = EXHIBIT_STATE[exhibit.state];
  return (
    <>
      <PageHead
        title={exhibit.titleEn}
        crumbs={[{ label: "Reviews", to: "/reviews" }]}
        subtitle={`by ${contributors.join(", ") || "nobody yet"}`}
        state={
          <StateMark tone={tone} large>
            {word}
          </StateMark>
        }
        actions={
          exhibit.state === "approved" && loaderData.mayPublish ? (
            <LinkButton look="primary" to={`/editions/${exhibit.id}`}>
              Publish it
            </LinkButton>
          ) : null
        }
      />
      {said && SAID[said] && !actionData ? <Notice tone="success">{SAID[said]}</Notice> : null}
      <FormErrors errors={actionData?.problem.errors} idFor={() => "main"} />
      <div className="mb-12 grid gap-14 lg:grid-cols-[3fr_2fr]">
        <Turn {...loaderData} />
        <div className="grid content-start gap-8">
          <section>
            <h2 className="mb-3">Checks</h2>
            <CheckList
              checks={checks}
              sceneName={(id) => content.scenes.find((scene) => scene.id === id)?.title.en ?? ""}
            />
          </section>
          <section>
            <h2 className="mb-3">Signed</h2>
            <SealHistory seals={seals} />
          </section>
        </div>
      </div>
      <div className="grid gap-12">
        {content.scenes.map((scene, at) => (
          <ReviewScene
            key={scene.id}
            exhibitId={exhibit.id}
            scene={scene}
            number={at + 1}
            languages={content.languages}
          />
        ))}
      </div>
      <p className="mt-10 text-sm text-ink-soft">
        Digest of what is shown here: <code className="num break-all">{digest}</code>
      </p>
    </>
  );
}

type Data = Route.ComponentProps["loaderData"];

const SIGNING = {
  verify: {
    head: "Verify it",
    words: "With your seal you vouch for every number on this page, exactly as it stands.",
    button: "Verify and seal",
  },
  approve: {
    head: "Approve it",
    words: "With your seal it may be published, exactly as the scientist verified it.",
    button: "Approve and seal",
  },
} as const;

/** What this person may do now, or why not. */
function Turn({ exhibit, digest, steps, checks, isOwnWork, hasSigned }: Data) {
  const step = steps.find((one) => one === "verify" || one === "approve");
  if (!step) {
    return (
      <section>
        <h2 className="mb-2">{exhibit.state === "draft" ? "It is with its editors" : "It is not your turn"}</h2>
        <p className="max-w-words text-ink-soft">
          {exhibit.state === "draft"
            ? "It comes here when they submit it."
            : "You may read everything; the next step takes another role."}{" "}
          <Link to={`/exhibits/${exhibit.id}`} className="link">
            Go to the exhibit
          </Link>
        </p>
      </section>
    );
  }
  if (isOwnWork || hasSigned) {
    return (
      <section>
        <h2 className="mb-2">Somebody else has to sign it</h2>
        <p className="max-w-words text-ink-soft">
          {isOwnWork ? "You have worked on this exhibit yourself." : "You have signed this round already."} Nobody signs
          their own work, whatever roles they hold.
        </p>
      </section>
    );
  }
  const blocked = checks.some((check) => check.level === "blocks");
  const signing = SIGNING[step];
  const hidden = (
    <>
      <input type="hidden" name="exhibitId" value={exhibit.id} />
      <input type="hidden" name="version" value={exhibit.version} />
    </>
  );
  return (
    <section className="grid content-start gap-6">
      <div>
        <h2 className="mb-2">{signing.head}</h2>
        {blocked ? (
          <p className="text-vermilion">Something blocks, so it cannot be signed. Send it back with a word about it.</p>
        ) : (
          <Form method="post" className="grid max-w-words gap-4">
            {hidden}
            <input type="hidden" name="digest" value={digest} />
            <p>{signing.words}</p>
            <TextArea id="sign-note" label="A note with it" name="note" rows={2} />
            <SubmitButton intent={step} pending="Sealing…" className="justify-self-start">
              {signing.button}
            </SubmitButton>
          </Form>
        )}
      </div>
      <Disclosure summary="Send it back" open={blocked}>
        <Form method="post" className="grid max-w-words gap-4">
          {hidden}
          <TextArea id="back-note" label="What has to be put right" name="note" rows={3} required />
          <SubmitButton intent="send-back" look="danger" pending="Sending…" className="justify-self-start">
            Send it back
          </SubmitButton>
        </Form>
      </Disclosure>
    </section>
  );
}
