/**
 * Words with bound figures. The text is plain; a blank line parts paragraphs; `{key}` stands for the figure of that key.
 * Braces that hold anything else than a key stay text, so that nothing a curator types can be lost.
 */
export type Segment = { text: string } | { figure: string };
export type Paragraph = Segment[];

export const FIGURE_KEY = /^[a-z][a-z0-9-]{0,39}$/;
const PLACEHOLDER = /\{([a-z][a-z0-9-]{0,39})\}/g;

export function parseWords(body: string): Paragraph[] {
  return body
    .replace(/\r\n?/g, "\n")
    .split(/\n[ \t]*\n/)
    .map((paragraph) => paragraph.trim())
    .filter((paragraph) => paragraph !== "")
    .map(parseParagraph);
}

function parseParagraph(text: string): Paragraph {
  const segments: Paragraph = [];
  let from = 0;
  for (const match of text.matchAll(PLACEHOLDER)) {
    if (match.index > from) segments.push({ text: text.slice(from, match.index) });
    segments.push({ figure: match[1] ?? "" });
    from = match.index + match[0].length;
  }
  if (from < text.length) segments.push({ text: text.slice(from) });
  return segments;
}

/** The keys that the words refer to, each once, in order of first use. */
export function figureKeys(body: string): string[] {
  return [...new Set([...body.matchAll(PLACEHOLDER)].map((match) => match[1] ?? ""))];
}

/** The words as a visitor reads them. A key without a figure stays visible as `{key}`: it must not vanish. */
export function plainWords(paragraphs: Paragraph[], textOf: (key: string) => string | null): string[] {
  return paragraphs.map((paragraph) =>
    paragraph
      .map((segment) => ("text" in segment ? segment.text : (textOf(segment.figure) ?? `{${segment.figure}}`)))
      .join(""),
  );
}
