import type { CastContent } from "#app/exhibits/content.ts";
import { epochText, measurementText } from "#app/figures/office-numbers.ts";
import { NightDialog } from "./NightDialog.tsx";
import { KIOSK_WORDS, type KioskLanguage } from "./words.ts";

/** Where a distance comes from: measured value, method, what the range means, epoch, source. */
export function HowWeKnow({
  member,
  language,
  onClose,
}: {
  member: CastContent;
  language: KioskLanguage;
  onClose: () => void;
}) {
  const words = KIOSK_WORDS[language];
  const rows: [string, string | null][] = [
    [words.parallax, member.parallax ? measurementText({ ...member.parallax, language }) : null],
    [words.method, member.method ? (words.methods[member.method] ?? member.method) : null],
    [words.epoch, member.epoch ? epochText(member.epoch) : null],
    [
      words.source,
      member.source
        ? [member.source.citation, member.source.bibcode ?? member.source.doi, member.source.locator]
            .filter(Boolean)
            .join(" · ")
        : null,
    ],
  ];
  return (
    <NightDialog title={`${member.name[language] ?? member.name.en}: ${words.how}`} onClose={onClose}>
      <p className="mb-4 text-lg">{member.distance?.[language].text}</p>
      <p className="mb-4">{words.chance}</p>
      <dl className="mb-8 border-t border-rule">
        {rows.map(([term, value]) =>
          value ? (
            <div key={term} className="border-b border-rule py-3">
              <dt className="label">{term}</dt>
              <dd className="text-lg">{value}</dd>
            </div>
          ) : null,
        )}
      </dl>
      <button type="button" onClick={onClose} className="target-mm-14 border-2 border-ink px-6 font-head text-lg">
        {words.close}
      </button>
    </NightDialog>
  );
}
