import type { SceneContent } from "#app/exhibits/content.ts";
import { BoundFigure } from "#app/ui/BoundFigure.tsx";

interface ReadWordsProps {
  scene: Pick<SceneContent, "words" | "figures">;
  language: "en" | "fr";
  className?: string;
}

/** The words as a visitor reads them, each bound number marked and leading to its record. */
export function ReadWords({ scene, language, className }: ReadWordsProps) {
  const paragraphs = scene.words[language] ?? [];
  if (paragraphs.length === 0) return <p className="text-ink-soft">No words yet.</p>;
  return (
    <div lang={language} className={className}>
      {paragraphs.map((paragraph, at) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: paragraphs have no other identity
        <p key={at} className="mb-3 text-lg">
          {paragraph.map((segment, place) => {
            if ("text" in segment) return segment.text;
            const figure = scene.figures[segment.figure];
            const text = figure?.[language]?.text ?? `{${segment.figure}}`;
            return (
              // biome-ignore lint/suspicious/noArrayIndexKey: a key may stand several times in one paragraph
              <BoundFigure key={place} to={figure ? `/stars/${figure.recordId}` : undefined}>
                {text}
              </BoundFigure>
            );
          })}
        </p>
      ))}
    </div>
  );
}
