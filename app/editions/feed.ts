import type { FigureContent, SceneContent } from "#app/exhibits/content.ts";
import { type Paragraph, plainWords } from "#app/exhibits/words.ts";
import type { LiveEdition } from "./read-newest.server.ts";

/** JSON Feed 1.1 (jsonfeed.org/version/1.1): one item a scene, and our own `_alidade` block beside it. */
export function feedOf(slug: string, edition: LiveEdition, publicUrl: string) {
  const { content } = edition;
  return {
    version: "https://jsonfeed.org/version/1.1",
    title: content.title.en,
    home_page_url: `${publicUrl}/`,
    feed_url: `${publicUrl}/feed/${slug}.json`,
    language: "en",
    authors: [{ name: "Tern Point Science Centre" }],
    _alidade: {
      exhibit: slug,
      edition: edition.number,
      digest: edition.digest,
      title: content.title,
      languages: content.languages,
    },
    items: content.scenes.map((scene) => itemOf(scene, slug, edition, publicUrl)),
  };
}

function itemOf(scene: SceneContent, slug: string, edition: LiveEdition, publicUrl: string) {
  const still = (language: string) => {
    const digest = edition.stills[`${scene.id}:${language}`];
    return digest ? `${publicUrl}/stills/${digest}.png` : undefined;
  };
  const text = resolved(scene, "en");
  return {
    // Unique over all time: the same scene in a later edition is another item.
    id: `${publicUrl}/feed/${slug}/${edition.number}/${scene.id}`,
    title: scene.title.en,
    content_text: text.join("\n\n"),
    content_html: text.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`).join(""),
    image: still("en"),
    date_published: edition.publishedAt.toISOString(),
    language: "en",
    _alidade: {
      edition: edition.number,
      digest: edition.digest,
      scene: scene.id,
      title: scene.title,
      claims: scene.claims,
      text: { en: text.join("\n\n"), fr: scene.words.fr ? resolved(scene, "fr").join("\n\n") : null },
      stills: { en: still("en") ?? null, fr: still("fr") ?? null },
      figures: Object.entries(scene.figures).map(([key, figure]) => ({ key, ...figureOf(figure) })),
      picture: scene.picture,
    },
  };
}

function figureOf(figure: FigureContent) {
  const { quantity, unit, form, en, fr, source } = figure;
  return {
    quantity,
    unit,
    form,
    text: { en: en?.text ?? null, fr: fr?.text ?? null },
    value: en?.value ?? null,
    range: en ? { low: en.low, high: en.high, meaning: "68 %" } : null,
    note: en?.note ?? null,
    source,
  };
}

function resolved(scene: SceneContent, language: "en" | "fr"): string[] {
  const paragraphs: Paragraph[] = scene.words[language] ?? [];
  return plainWords(paragraphs, (key) => scene.figures[key]?.[language]?.text ?? null);
}

function escapeHtml(text: string): string {
  const marks: Record<string, string> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" };
  return text.replace(/[&<>"]/g, (mark) => marks[mark] ?? mark);
}
