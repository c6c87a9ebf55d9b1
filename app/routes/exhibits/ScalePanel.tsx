import { useRef } from "react";
import { Form } from "react-router";
import type { readScene } from "#app/exhibits/read-scene.server.ts";
import type { FormProblem } from "#app/http.server.ts";
import { SceneDocument } from "#app/scene/document.ts";
import type { Orbit } from "#app/stage/camera.ts";
import { Button } from "#app/ui/Button.tsx";
import { Checkbox } from "#app/ui/Checkbox.tsx";
import { Field } from "#app/ui/Field.tsx";
import { RadioGroup } from "#app/ui/RadioGroup.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { formState } from "../form-state.ts";

type Page = Awaited<ReturnType<typeof readScene>>;

interface ScalePanelProps extends Pick<Page, "exhibit" | "scene" | "resolved"> {
  mayWrite: boolean;
  actionData: FormProblem | undefined;
  /** Where the stage was turned to. */
  view: Orbit | null;
  onTry: (document: SceneDocument) => void;
}

const CAMERA = [
  { name: "azimuthDeg", label: "Around", unit: "°" },
  { name: "elevationDeg", label: "Above", unit: "°" },
  { name: "distance", label: "Away", unit: "× fit" },
  { name: "fovDeg", label: "Wide", unit: "°" },
] as const;

/** The document as the form stands now; null while a field makes no sense. */
function documentOf(form: HTMLFormElement): SceneDocument | null {
  const data = new FormData(form);
  const text = (name: string) => data.get(`document.${name}`) ?? undefined;
  const parsed = SceneDocument.safeParse({
    kind: "volume",
    mapping: text("mapping"),
    unit: text("unit"),
    rings: data.has("document.rings") ? "auto" : "none",
    errorBars: data.has("document.errorBars"),
    labels: data.has("document.labels"),
    camera: Object.fromEntries(CAMERA.map(({ name }) => [name, text(`camera.${name}`)])),
  });
  return parsed.success ? parsed.data : null;
}

/** Titles, scale and first view of a scene. What is changed shows on the stage before it is saved. */
export function ScalePanel({ exhibit, scene, resolved, mayWrite, actionData, view, onTry }: ScalePanelProps) {
  const { document } = resolved;
  const saved = {
    titleEn: scene.titleEn,
    titleFr: scene.titleFr,
    "document.mapping": document.mapping,
    "document.unit": document.unit,
    ...Object.fromEntries(CAMERA.map(({ name }) => [`document.camera.${name}`, document.camera[name]])),
  };
  const form = formState(actionData, saved, "save-scene");
  const element = useRef<HTMLFormElement>(null);
  const field = (name: string) => ({ name, defaultValue: form.value(name), error: form.error(name) });
  const tryOut = () => {
    const next = element.current && documentOf(element.current);
    if (next) onTry(next);
  };
  const takeView = () => {
    if (!view || !element.current) return;
    for (const name of ["azimuthDeg", "elevationDeg", "distance"] as const) {
      const input = element.current.elements.namedItem(`document.camera.${name}`);
      // A thousandth of a degree is finer than anybody turns.
      if (input instanceof HTMLInputElement) input.value = String(Math.round(view[name] * 1000) / 1000);
    }
    tryOut();
  };
  return (
    <Form ref={element} method="post" noValidate onChange={tryOut} className="grid gap-6">
      <input type="hidden" name="sceneId" value={scene.id} />
      <input type="hidden" name="version" value={scene.version} />
      <Field label="Title of the scene" required {...field("titleEn")} />
      {exhibit.languages.includes("fr") ? <Field label="Title in French" lang="fr" {...field("titleFr")} /> : null}
      <RadioGroup
        label="Distances"
        options={[
          { value: "linear", label: "To scale", hint: "Every distance in its true proportion." },
          { value: "log", label: "Drawn together", hint: "Near and far fit; the scene says it is not to scale." },
        ]}
        {...field("document.mapping")}
      />
      <RadioGroup
        label="Rings and labels in"
        inline
        options={[
          { value: "ly", label: "light-years" },
          { value: "pc", label: "parsecs" },
        ]}
        {...field("document.unit")}
      />
      <div>
        <Checkbox
          name="document.rings"
          label="Distance rings"
          defaultChecked={form.ticked("document.rings", document.rings === "auto")}
        />
        <Checkbox
          name="document.errorBars"
          label="Error bars along the line of sight"
          defaultChecked={form.ticked("document.errorBars", document.errorBars)}
        />
        <Checkbox
          name="document.labels"
          label="Names and distances"
          defaultChecked={form.ticked("document.labels", document.labels)}
        />
      </div>
      <fieldset className="grid gap-4">
        <legend className="mb-2 font-head text-sm font-medium">First view</legend>
        <div className="grid grid-cols-2 gap-4">
          {CAMERA.map(({ name, label, unit }) => (
            <Field key={name} label={label} unit={unit} inputMode="decimal" {...field(`document.camera.${name}`)} />
          ))}
        </div>
        {mayWrite && view ? (
          <Button onClick={takeView} className="justify-self-start">
            Take the view on the stage
          </Button>
        ) : null}
      </fieldset>
      {mayWrite ? (
        <SubmitButton intent="save-scene" className="justify-self-start">
          Keep the scene
        </SubmitButton>
      ) : null}
    </Form>
  );
}
