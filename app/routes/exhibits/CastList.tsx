import { Form, Link, useFetcher } from "react-router";
import type { readScene } from "#app/exhibits/read-scene.server.ts";
import type { FormProblem } from "#app/http.server.ts";
import { Notice } from "#app/ui/Notice.tsx";
import { Select } from "#app/ui/Select.tsx";
import { SortableList } from "#app/ui/SortableList.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { REGIME_WORDS } from "../stars/words.ts";
import { MoveButtons } from "./MoveButtons.tsx";

type Page = Awaited<ReturnType<typeof readScene>>;
type Member = Page["resolved"]["cast"][number];

interface CastListProps extends Pick<Page, "scene" | "resolved"> {
  records: readonly { id: string; name: string; state: string }[];
  mayWrite: boolean;
  actionData: FormProblem | undefined;
  selectedId: string | null;
  onSelect: (recordId: string | null) => void;
}

/** Who is in the scene, in order; chosen here, they are marked on the stage. */
export function CastList({ scene, resolved, records, mayWrite, selectedId, onSelect }: CastListProps) {
  const fetcher = useFetcher<FormProblem>();
  const items = resolved.cast.map((member) => ({ id: member.recordId, name: member.name.en, member }));
  const reorder = (order: string[]) => {
    const form = new FormData();
    form.set("intent", "order-cast");
    form.set("sceneId", scene.id);
    form.set("version", String(scene.version));
    for (const id of order) form.append("order", id);
    fetcher.submit(form, { method: "post" });
  };
  const absent = records.filter((one) => !resolved.cast.some((member) => member.recordId === one.id));
  const refused = fetcher.data?.problem;
  return (
    <>
      <h2 className="mb-3">Cast</h2>
      {refused ? <Notice tone="error">{refused.message}</Notice> : null}
      {items.length === 0 ? <p className="mb-4 text-ink-soft">Nobody yet. Add the first star below.</p> : null}
      <SortableList label="Cast" items={items} onOrder={reorder} fixed={!mayWrite || items.length < 2}>
        {(item, at) => (
          <>
            <button
              type="button"
              aria-pressed={item.id === selectedId}
              onClick={() => onSelect(item.id === selectedId ? null : item.id)}
              className={`flex w-full flex-wrap items-baseline justify-between gap-x-3 text-left ${item.id === selectedId ? "bg-paper-shade font-semibold" : ""}`}
            >
              <span>{item.name}</span>
              <span className="num font-head text-sm">{item.member.distance?.en.text ?? "no distance"}</span>
            </button>
            <Standing member={item.member} />
            {mayWrite ? (
              <div className="mt-1 flex flex-wrap items-center gap-1">
                <MoveButtons
                  name={item.name}
                  intent="move-cast"
                  hidden={{ recordId: item.id, version: scene.version }}
                  first={at === 0}
                  last={at === items.length - 1}
                />
                <MemberForms member={item.member} scene={scene} />
              </div>
            ) : null}
          </>
        )}
      </SortableList>
      {mayWrite ? (
        <Form method="post" className="mt-5 grid gap-3">
          <input type="hidden" name="sceneId" value={scene.id} />
          <input type="hidden" name="version" value={scene.version} />
          <Select
            key={absent.length}
            label="Add a record"
            name="recordId"
            placeholder="Choose a record"
            options={absent.map((one) => ({
              value: one.id,
              label: one.state === "vetted" ? one.name : `${one.name} (draft)`,
            }))}
          />
          <SubmitButton intent="add-to-cast" look="quiet" pending="Adding…" className="justify-self-start">
            Add to the cast
          </SubmitButton>
        </Form>
      ) : null}
    </>
  );
}

function Standing({ member }: { member: Member }) {
  return (
    <p className="flex flex-wrap items-center gap-x-3 text-sm text-ink-soft">
      <Link to={`/stars/${member.recordId}`} className="link tap inline-flex items-center">
        record
      </Link>
      {member.regime ? REGIME_WORDS[member.regime] : null}
      <StateMark tone={member.vetted ? "vetted" : "person"}>{member.vetted ? "vetted" : "not vetted"}</StateMark>
    </p>
  );
}

function MemberForms({ member, scene }: { member: Member; scene: Page["scene"] }) {
  return (
    <Form method="post" preventScrollReset className="flex">
      <input type="hidden" name="sceneId" value={scene.id} />
      <input type="hidden" name="version" value={scene.version} />
      <input type="hidden" name="recordId" value={member.recordId} />
      <input type="hidden" name="labelled" value={member.labelled ? "no" : "yes"} />
      <SubmitButton
        intent="label-cast"
        look="plain"
        pending="…"
        className="px-1.5 text-sm font-normal"
        aria-label={`${member.labelled ? "Hide" : "Show"} the name of ${member.name.en} in the picture`}
      >
        {member.labelled ? "hide name" : "show name"}
      </SubmitButton>
      <SubmitButton
        intent="remove-from-cast"
        look="plain"
        pending="…"
        className="px-1.5 text-sm font-normal"
        aria-label={`Take ${member.name.en} out of the cast`}
      >
        take out
      </SubmitButton>
    </Form>
  );
}
