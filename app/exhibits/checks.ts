import type { ExhibitContent, SceneContent } from "./content.ts";
import { type Paragraph, plainWords } from "./words.ts";

/** What stands in the way of a sign-off ("blocks"), or deserves a look ("warns"). */
export interface Check {
  level: "blocks" | "warns";
  /** null: the exhibit as a whole. */
  sceneId: string | null;
  message: string;
}

/** A number typed by hand next to a unit of length or time: it should be a bound figure. */
const TYPED_NUMBER =
  /\d[\d\s.,\u00a0\u202f]*\s*(?:light-years?|lightyears?|ly|parsecs?|pc|au|km|années?-lumière|al|years?|ans?)\b/iu;

/** Every check of PRODUCT.md's chain that content alone can decide. Empty: nothing blocks and nothing warns. */
export function checkContent(content: ExhibitContent): Check[] {
  const checks: Check[] = [];
  if (content.scenes.length === 0) checks.push(blocks(null, "The exhibit has no scene."));
  const bound = content.scenes.some((scene) => usedKeys(scene).size > 0);
  if (content.scenes.length > 0 && !bound) {
    checks.push(blocks(null, "No figure is bound in the words: a visitor would read no verified number."));
  }
  for (const scene of content.scenes) {
    checks.push(...checkCast(scene), ...checkWords(scene, content.languages.includes("fr")), ...checkFigures(scene));
  }
  return checks;
}

function blocks(sceneId: string | null, message: string): Check {
  return { level: "blocks", sceneId, message };
}

function checkCast(scene: SceneContent): Check[] {
  if (scene.cast.length === 0) return [blocks(scene.id, "The cast is empty.")];
  return scene.cast.flatMap((member) => {
    const name = member.name.en;
    const found: Check[] = [];
    if (!member.vetted) found.push(blocks(scene.id, `${name} is not vetted.`));
    if (member.raDeg === null || member.decDeg === null) found.push(blocks(scene.id, `${name} has no position.`));
    if (!member.distancePc) {
      found.push(blocks(scene.id, `${name} has no distance that may be shown: adopt a parallax, or choose a prior.`));
    }
    return found;
  });
}

function checkWords(scene: SceneContent, french: boolean): Check[] {
  const found: Check[] = [];
  if (scene.words.en.length === 0) found.push(blocks(scene.id, "There are no English words."));
  if (french) {
    if (!scene.words.fr?.length) found.push(blocks(scene.id, "There are no French words, and the exhibit has French."));
    if (!scene.title.fr) found.push(blocks(scene.id, "The scene has no French title."));
    if (scene.picture && !scene.picture.alt.fr) {
      found.push(blocks(scene.id, "The picture has no French alternative text."));
    }
  }
  for (const text of typedText(scene)) {
    const typed = text.match(TYPED_NUMBER)?.[0];
    if (typed) {
      found.push({
        level: "warns",
        sceneId: scene.id,
        message: `“${typed.trim()}” is typed by hand next to a unit: bind it to a record.`,
      });
    }
  }
  return found;
}

/** The words between the figures, which stand as a gap that no number can reach across. */
function typedText(scene: SceneContent): string[] {
  return [scene.words.en, scene.words.fr ?? []].flatMap((paragraphs) => plainWords(paragraphs, () => "\n"));
}

function keysIn(paragraphs: Paragraph[]): string[] {
  return paragraphs.flatMap((paragraph) => paragraph.flatMap((part) => ("figure" in part ? [part.figure] : [])));
}

export function usedKeys(scene: SceneContent): Set<string> {
  return new Set([...keysIn(scene.words.en), ...keysIn(scene.words.fr ?? [])]);
}

function checkFigures(scene: SceneContent): Check[] {
  const used = usedKeys(scene);
  const found: Check[] = [];
  for (const key of used) {
    const figure = scene.figures[key];
    if (!figure) found.push(blocks(scene.id, `The words name {${key}}, but no figure is bound to it.`));
    else if (!figure.en) found.push(blocks(scene.id, `{${key}} cannot be said: ${figure.reason}`));
  }
  for (const key of Object.keys(scene.figures)) {
    if (!used.has(key)) {
      found.push({
        level: "warns",
        sceneId: scene.id,
        message: `The figure {${key}} is bound but the words do not use it.`,
      });
    }
  }
  return found;
}
