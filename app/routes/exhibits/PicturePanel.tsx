import { Form, Link } from "react-router";
import type { readScene } from "#app/exhibits/read-scene.server.ts";
import { Select } from "#app/ui/Select.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";

type Page = Awaited<ReturnType<typeof readScene>>;

/** The picture beside the words; it is shown with its credit, always. */
export function PicturePanel({
  scene,
  resolved,
  pictures,
  mayWrite,
}: Pick<Page, "scene" | "resolved" | "pictures"> & { mayWrite: boolean }) {
  const { picture } = resolved;
  return (
    <div className="grid gap-6">
      {picture ? (
        <dl className="grid gap-2">
          <div>
            <dt className="label">Credit</dt>
            <dd>
              {picture.creditLine} ({picture.creator}, {picture.licence})
            </dd>
          </div>
          <div>
            <dt className="label">Read to those who do not see it</dt>
            <dd>{picture.alt.en}</dd>
          </div>
        </dl>
      ) : (
        <p className="text-ink-soft">This scene has no picture beside its words.</p>
      )}
      {mayWrite ? (
        <Form method="post" className="grid gap-4">
          <input type="hidden" name="sceneId" value={scene.id} />
          <input type="hidden" name="version" value={scene.version} />
          <Select
            label="Picture"
            name="mediaId"
            placeholder="No picture"
            defaultValue={scene.mediaId ?? ""}
            options={pictures.map((one) => ({ value: one.id, label: `${one.fileName}: ${one.altEn}` }))}
          />
          <SubmitButton intent="set-media" className="justify-self-start">
            Keep this choice
          </SubmitButton>
        </Form>
      ) : null}
      <p>
        <Link to="/media" className="link">
          All pictures
        </Link>
      </p>
    </div>
  );
}
