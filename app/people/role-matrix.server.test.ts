import { readdirSync, readFileSync } from "node:fs";
import { resolve } from "node:path";
import { beforeAll, expect, test } from "vitest";
import "#app/review/register.server.ts";
import { type Actor, ROLES, type Role } from "#app/audit/actor.ts";
import { Forbidden, Unauthenticated } from "#app/errors.ts";
import { makeActor } from "#tests/factories/person.ts";
import { mayDo, PERMISSIONS, type Permission } from "./permissions.ts";

// Every verb and every page read is found in the sources, so that a new one cannot slip through.

interface Verb {
  file: string;
  name: string;
  permission: Permission;
}

/** Changes that need no role: whoever has the password or the link in the mail. Their files say "Public". */
const PUBLIC = new Set([
  "app/people/sign-in.server.ts",
  "app/people/choose-password.server.ts",
  "app/people/request-reset.server.ts",
  "app/people/invite-first-admin.server.ts",
]);

/** Take an actor and do not ask, because they are no verbs: how changes are written down, and predicates. */
const NO_VERBS = new Map([
  ["change", "writes down what a verb does"],
  ["openInvited", "the work of two verbs, which have asked"],
  ["mayReject", "answers yes or no"],
  ["mayConfirm", "answers yes or no"],
  ["actOnScene", "hands a form to the verb of its intent"],
]);

const below = (folder: string, ending: RegExp) =>
  readdirSync(folder, { recursive: true, encoding: "utf8" })
    .filter((file) => ending.test(file))
    .map((file) => `${folder}/${file}`)
    .sort();
const files = below("app", /\.server\.ts$/);
const sourceOf = (file: string) => readFileSync(file, "utf8");

const verbs: Verb[] = files.flatMap((file) =>
  sourceOf(file)
    .split(/(?=export async function )/)
    .flatMap((part) => {
      const name = /^export async function (\w+)/.exec(part)?.[1];
      const permission = /authorise\(actor, "([\w.-]+)"\)/.exec(part)?.[1];
      return name && permission ? [{ file, name, permission: permission as Permission }] : [];
    }),
);

const people = new Map<Role, Actor>();
beforeAll(async () => {
  for (const role of ROLES) people.set(role, await makeActor(role));
});

type Callable = (actor: Actor | null, ...rest: unknown[]) => Promise<unknown>;

/** What the verb says to somebody; an input that is nobody's, so that nothing can be changed by asking. */
async function answer(verb: Verb, actor: Actor | null): Promise<unknown> {
  const module = (await import(resolve(verb.file))) as Record<string, Callable>;
  const nothing = { exhibitId: "-", sceneId: "-", recordId: "-", personId: "-", kioskId: "-", version: 0, order: [] };
  const ask = module[verb.name];
  if (!ask) throw new Error(`${verb.file} does not export ${verb.name}`);
  return ask(actor, nothing, { bytes: new Uint8Array(), fileName: "-" }, new FormData()).then(
    () => null,
    (error: unknown) => error,
  );
}

test("the sources hold the verbs that people use", () => {
  expect(verbs.length).toBeGreaterThan(55);
  for (const { permission } of verbs) expect(Object.keys(PERMISSIONS)).toContain(permission);
});

test("whatever takes an actor asks who may, and is walked below", () => {
  const walked = new Set(verbs.map((verb) => `${verb.file} ${verb.name}`));
  const taking = /^export (?:async function|function|const) (\w+)(?:<[^(]*>)?[^(\n]*\(\s*_?\w+: (?:Pick<)?Actor\b/gm;
  const found = files.flatMap((file) =>
    [...sourceOf(file).matchAll(taking)].map((match) => ({ file, name: match[1] ?? "" })),
  );
  expect(found.length).toBeGreaterThan(55);
  const unasked = found.filter(({ file, name }) => !walked.has(`${file} ${name}`) && !NO_VERBS.has(name));
  expect(unasked).toEqual([]);
  // No name stands in the list that is not there any more.
  expect([...NO_VERBS.keys()].filter((name) => !found.some((one) => one.name === name))).toEqual([]);
});

test("whatever changes something asks who may, first thing, or is public by name", () => {
  const unasked = files.filter((file) => {
    const source = sourceOf(file);
    const changes = /(?:return|await|=>) change\(/.test(source);
    return changes && !source.includes("authorise(") && !PUBLIC.has(file);
  });
  expect(unasked).toEqual([]);
  for (const file of PUBLIC) expect(sourceOf(file), file).toContain("Public");
});

test("every permission of the matrix is asked for by somebody, on a page or by a verb", () => {
  const routes = below("app/routes", /\.tsx?$/)
    .map(sourceOf)
    .join("\n");
  const asked = new Set<string>(verbs.map((verb) => verb.permission));
  const idle = Object.keys(PERMISSIONS).filter((one) => !asked.has(one) && !routes.includes(`"${one}"`));
  // The steps of the workflow carry theirs as data (review/workflow.ts).
  expect(idle.filter((one) => !sourceOf("app/review/workflow.ts").includes(`"${one}"`))).toEqual([]);
});

test.each(verbs)("$name ($permission) is refused to nobody and to every role without it", async (verb) => {
  expect(await answer(verb, null)).toBeInstanceOf(Unauthenticated);
  for (const role of ROLES) {
    const said = await answer(verb, people.get(role) ?? null);
    if (mayDo([role], verb.permission)) {
      expect(said, `${role} may`).not.toBeInstanceOf(Unauthenticated);
      expect(said, `${role} may`).not.toBeInstanceOf(Forbidden);
    } else {
      expect(said, `${role} may not`).toBeInstanceOf(Forbidden);
    }
  }
});

test("several roles are the sum of each, and an administrator inherits none of them", () => {
  for (const permission of Object.keys(PERMISSIONS) as Permission[]) {
    for (const one of ROLES) {
      for (const other of ROLES) {
        expect(mayDo([one, other], permission)).toBe(mayDo([one], permission) || mayDo([other], permission));
      }
    }
  }
  for (const editorial of [
    "record.write",
    "record.vet",
    "exhibit.write",
    "review.verify",
    "edition.publish",
  ] as const) {
    expect(mayDo(["admin"], editorial)).toBe(false);
  }
});
