import { getInputProps, getSelectProps, useForm } from "@conform-to/react";
import { parseWithZod } from "@conform-to/zod/v4";
import { renderToStaticMarkup } from "react-dom/server";
import { expect, test } from "vitest";
import { z } from "zod";
import { Checkbox } from "./Checkbox.tsx";
import { Field } from "./Field.tsx";
import { RadioGroup } from "./RadioGroup.tsx";
import { Select } from "./Select.tsx";

// The describers of a control, as the texts that a screen reader would read behind its name.
function described(html: string, id: string): string[] {
  const control = html.match(new RegExp(`<(?:input|select|textarea|fieldset)[^>]*\\bid="${id}"[^>]*>`))?.[0] ?? "";
  const ids = control.match(/aria-describedby="([^"]*)"/)?.[1]?.split(" ") ?? [];
  return ids.map((one) => {
    const inner = html.match(new RegExp(`id="${one}"[^>]*>(.*?)</(?:p|div|span)>`))?.[1];
    return (inner ?? `nothing has the id ${one}`).replace(/<[^>]+>/g, "");
  });
}

test("a plain field is labelled, and described by its unit, hint and error", () => {
  const html = renderToStaticMarkup(
    <Field label="Parallax" name="parallax" unit="mas" hint="As printed." error="Write a number." required />,
  );
  expect(html).toContain('<label for="parallax"');
  expect(described(html, "parallax")).toEqual(["mas", "As printed.", "Write a number."]);
  expect(html).toContain('aria-invalid="true"');
});

test("a field without hint and error carries neither describer nor a mark of being wrong", () => {
  const html = renderToStaticMarkup(<Field label="Name" name="name" error={[]} />);
  expect(html).not.toContain("aria-describedby=");
  expect(html).not.toContain("aria-invalid=");
});

test("boxes of one name keep ids of their own", () => {
  const html = renderToStaticMarkup(
    <>
      <Checkbox label="curator" name="roles" value="editor" />
      <Checkbox label="publisher" name="roles" value="publisher" />
    </>,
  );
  expect(html).toContain('for="roles-editor"');
  expect(html).toContain('for="roles-publisher"');
});

test("a radio group is described as a whole", () => {
  const html = renderToStaticMarkup(
    <RadioGroup label="Prior" name="prior" hint="Named." error="Choose one." options={[{ value: "a", label: "A" }]} />,
  );
  expect(described(html, "prior")).toEqual(["Named.", "Choose one."]);
});

const Schema = z.object({ parallax: z.number(), source: z.string() });

function ConformForm() {
  const data = new FormData();
  data.set("parallax", "much");
  const [, fields] = useForm<z.infer<typeof Schema>>({
    id: "m",
    lastResult: parseWithZod(data, { schema: Schema }).reply(),
  });
  const { key: inputKey, ...input } = getInputProps(fields.parallax, { type: "text" });
  const { key: selectKey, ...select } = getSelectProps(fields.source);
  return (
    <form>
      <Field key={inputKey} {...input} label="Parallax" error={fields.parallax.errors} />
      <Select key={selectKey} {...select} label="Source" options={[]} error={fields.source.errors} />
    </form>
  );
}

test("conform's props can be spread: its ids, its errors and what was typed stay", () => {
  const html = renderToStaticMarkup(<ConformForm />);
  expect(html).toContain('for="m-parallax"');
  expect(html).toContain('value="much"');
  expect(described(html, "m-parallax")).toEqual([expect.stringContaining("expected number")]);
  expect(described(html, "m-source")).toEqual([expect.stringContaining("expected string")]);
});
