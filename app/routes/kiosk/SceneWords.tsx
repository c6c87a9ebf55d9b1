import type { SceneContent } from "#app/exhibits/content.ts";
import type { KioskLanguage } from "./words.ts";

/** The words of a scene with their figures set apart. */
export function SceneWords({ scene, language }: { scene: SceneContent; language: KioskLanguage }) {
  return (
    <>
      {(scene.words[language] ?? scene.words.en).map((paragraph, at) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: paragraphs have no other identity
        <p key={at} className="mb-3 text-lg text-pretty">
          {paragraph.map((segment, place) =>
            "text" in segment ? (
              segment.text
            ) : (
              // biome-ignore lint/suspicious/noArrayIndexKey: a figure may stand several times in one paragraph
              <strong key={place} className="font-head font-medium">
                {scene.figures[segment.figure]?.[language]?.text ?? scene.figures[segment.figure]?.en?.text}
              </strong>
            ),
          )}
        </p>
      ))}
    </>
  );
}
