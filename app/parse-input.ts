import type { z } from "zod";
import { type FieldErrors, Invalid } from "./errors.ts";

/** "name", "names[0].text": how a field is called in a form and in its errors. */
function fieldName(path: PropertyKey[]): string {
  return path
    .map((part, at) => (typeof part === "number" ? `[${part}]` : at === 0 ? String(part) : `.${String(part)}`))
    .join("");
}

function plainObject(form: FormData): Record<string, unknown> {
  const plain: Record<string, unknown> = {};
  for (const name of new Set(form.keys())) {
    const values = form.getAll(name);
    plain[name] = values.length > 1 ? values : values[0];
  }
  return plain;
}

/**
 * Reads a form (or an object) by its schema. A field that comes several times is an array.
 * @throws Invalid with each message at its field; a message about the whole is under "".
 */
export function parseInput<S extends z.ZodType>(schema: S, input: FormData | Record<string, unknown>): z.output<S> {
  const parsed = schema.safeParse(input instanceof FormData ? plainObject(input) : input);
  if (parsed.success) return parsed.data;
  const fields: FieldErrors = {};
  for (const issue of parsed.error.issues) {
    const name = fieldName(issue.path);
    // hasOwn: a field may be called "constructor".
    fields[name] = [...(Object.hasOwn(fields, name) ? (fields[name] ?? []) : []), issue.message];
  }
  throw new Invalid(fields);
}
