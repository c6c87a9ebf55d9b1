import canonicalize from "canonicalize";
import type { ExhibitContent, FigureContent, SceneContent } from "#app/exhibits/content.ts";
import { plainWords } from "#app/exhibits/words.ts";

/** One difference between what was sealed and what stands now. */
export interface Moved {
  /** "figure" when a bound number moved; "text" for words, titles, alt texts; "scene" for cast, camera, pictures. */
  kind: "figure" | "text" | "scene";
  sceneTitle: string;
  /** What moved, in words: "figure vega in the words", "distance of Vega". */
  what: string;
  before: string | null;
  after: string | null;
  /** false: the value moved but a visitor reads the same ("reads the same"). */
  readsDifferently: boolean;
}

/**
 * What moved between two resolved contents, figures first. Empty exactly when nothing that is sealed differs in
 * titles, words, figures, cast, picture or document.
 */
export function compareContent(before: ExhibitContent, after: ExhibitContent): Moved[] {
  const moved: Moved[] = [];
  pushText(moved, after.title.en, "title of the exhibit", before.title, after.title);
  pushOther(moved, after.title.en, "address of the exhibit", before.slug, after.slug);
  pushOther(moved, after.title.en, "languages", before.languages, after.languages);
  const old = new Map(before.scenes.map((scene) => [scene.id, scene]));
  for (const scene of after.scenes) {
    const was = old.get(scene.id);
    if (was) moved.push(...compareScene(was, scene));
    else moved.push(change("scene", scene.title.en, "scene added", null, scene.title.en));
  }
  const kept = new Set(after.scenes.map((scene) => scene.id));
  for (const scene of before.scenes) {
    if (!kept.has(scene.id)) moved.push(change("scene", scene.title.en, "scene removed", scene.title.en, null));
  }
  pushOther(moved, after.title.en, "order of the scenes", order(before, kept), order(after, new Set(old.keys())));
  const rank = { figure: 0, text: 1, scene: 2 };
  return moved.sort((a, b) => rank[a.kind] - rank[b.kind]);
}

/** Equal as sealed: what was read back from a seal has its keys in another order. */
function same(a: unknown, b: unknown): boolean {
  return canonicalize(a) === canonicalize(b);
}

function order(content: ExhibitContent, among: Set<string>): string {
  return content.scenes
    .filter((scene) => among.has(scene.id))
    .map((scene) => scene.id)
    .join(" ");
}

function compareScene(before: SceneContent, after: SceneContent): Moved[] {
  const moved: Moved[] = [];
  const title = after.title.en;
  compareFigures(moved, before, after);
  compareCast(moved, before, after);
  pushText(moved, title, "title of the scene", before.title, after.title);
  for (const language of ["en", "fr"] as const) {
    pushPlain(moved, title, `words (${language})`, template(before, language), template(after, language));
  }
  pushOther(moved, title, "the picture's file", before.picture?.digest ?? null, after.picture?.digest ?? null);
  pushOther(moved, title, "credit of the picture", credit(before), credit(after));
  pushText(moved, title, "alt text of the picture", before.picture?.alt ?? NOTHING, after.picture?.alt ?? NOTHING);
  pushOther(moved, title, "view and scale", before.document, after.document);
  pushOther(moved, title, "the two claims", before.claims, after.claims);
  return moved;
}

const NOTHING = { en: null, fr: null };

function credit(scene: SceneContent): string | null {
  if (!scene.picture) return null;
  const { creator, creditLine, licence } = scene.picture;
  return `${creditLine} (${creator}, ${licence})`;
}

/** The words with `{key}` in place of the figures: a figure that moves is told once, as a figure. */
function template(scene: SceneContent, language: "en" | "fr"): string | null {
  const paragraphs = scene.words[language];
  return paragraphs ? plainWords(paragraphs, () => null).join("\n\n") : null;
}

function compareFigures(moved: Moved[], before: SceneContent, after: SceneContent): void {
  for (const key of new Set([...Object.keys(before.figures), ...Object.keys(after.figures)])) {
    const was = before.figures[key];
    const is = after.figures[key];
    if (same(was, is)) continue;
    const reads = shown(was) !== shown(is);
    moved.push({
      kind: "figure",
      sceneTitle: after.title.en,
      what: `figure {${key}} in the words`,
      before: shown(was),
      after: shown(is),
      readsDifferently: reads,
    });
  }
}

function shown(figure: FigureContent | undefined): string | null {
  if (!figure) return null;
  return [figure.en?.text ?? figure.reason, figure.fr?.text].filter(Boolean).join(" / ");
}

function compareCast(moved: Moved[], before: SceneContent, after: SceneContent): void {
  const old = new Map(before.cast.map((member) => [member.recordId, member]));
  for (const member of after.cast) {
    const was = old.get(member.recordId);
    if (!was) {
      moved.push(change("scene", after.title.en, "joined the cast", null, member.name.en));
      continue;
    }
    if (same(was, member)) continue;
    const sameDistance = same(was.distancePc, member.distancePc);
    const reads = [was.distance?.en.text ?? null, member.distance?.en.text ?? null] as const;
    const frenchReads = was.distance?.fr.text !== member.distance?.fr.text;
    if (!sameDistance || reads[0] !== reads[1]) {
      moved.push({
        kind: "figure",
        sceneTitle: after.title.en,
        what: `distance of ${member.name.en}`,
        before: reads[0],
        after: reads[1],
        readsDifferently: reads[0] !== reads[1] || frenchReads,
      });
    } else {
      const { before: left, after: right } = firstDifference(was, member);
      moved.push(change("scene", after.title.en, `record of ${member.name.en}`, left, right));
    }
  }
  const kept = new Set(after.cast.map((member) => member.recordId));
  for (const member of before.cast) {
    if (!kept.has(member.recordId)) {
      moved.push(change("scene", after.title.en, "left the cast", member.name.en, null));
    }
  }
  const left = before.cast.filter((member) => kept.has(member.recordId)).map((member) => member.name.en);
  const right = after.cast.filter((member) => old.has(member.recordId)).map((member) => member.name.en);
  if (new Set(left).size === right.length) pushOther(moved, after.title.en, "order of the cast", left, right);
}

function firstDifference(before: object, after: object): { before: string; after: string } {
  const left = before as Record<string, unknown>;
  const right = after as Record<string, unknown>;
  const field = Object.keys({ ...left, ...right }).find((name) => !same(left[name], right[name]));
  const say = (value: unknown) => `${field}: ${typeof value === "string" ? value : canonicalize(value)}`;
  return { before: say(left[field ?? ""]), after: say(right[field ?? ""]) };
}

function change(
  kind: Moved["kind"],
  sceneTitle: string,
  what: string,
  before: string | null,
  after: string | null,
): Moved {
  return { kind, sceneTitle, what, before, after, readsDifferently: true };
}

type MaybeBilingual = { en: string | null; fr: string | null };

function pushText(moved: Moved[], scene: string, what: string, before: MaybeBilingual, after: MaybeBilingual): void {
  pushPlain(moved, scene, `${what} (en)`, before.en, after.en);
  pushPlain(moved, scene, `${what} (fr)`, before.fr, after.fr);
}

function pushPlain(moved: Moved[], scene: string, what: string, before: string | null, after: string | null): void {
  if (before !== after) moved.push(change("text", scene, what, before, after));
}

function pushOther(moved: Moved[], scene: string, what: string, before: unknown, after: unknown): void {
  const say = (value: unknown) => (value === null || typeof value === "string" ? value : (canonicalize(value) ?? null));
  if (say(before) !== say(after)) moved.push(change("scene", scene, what, say(before), say(after)));
}
