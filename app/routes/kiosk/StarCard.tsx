import type { CastContent } from "#app/exhibits/content.ts";
import { SpreadBar } from "#app/ui/SpreadBar.tsx";
import { KIOSK_WORDS, type KioskLanguage } from "./words.ts";

interface StarCardProps {
  member: CastContent | undefined;
  language: KioskLanguage;
  onHow: () => void;
}

/** The star that was touched: how far, how sure, and the way to why. */
export function StarCard({ member, language, onHow }: StarCardProps) {
  const words = KIOSK_WORDS[language];
  const distance = member?.distance?.[language];
  if (!member || !distance || !member.distancePc) return <p className="text-lg text-ink-soft">{words.touch}</p>;
  const { value, low, high } = member.distancePc;
  return (
    <div className="grid justify-items-start gap-3">
      <h2 className="text-2xl">{member.name[language] ?? member.name.en}</h2>
      <p className="flex flex-wrap items-baseline gap-x-3 font-head">
        <span className="text-4xl font-medium">{distance.value ?? words.between(distance.low, distance.high)}</span>
        <span className="text-xl text-ink-soft">{distance.unit}</span>
      </p>
      <div className="w-full max-w-md">
        <SpreadBar
          low={low}
          high={high}
          value={distance.value ? value : undefined}
          size="large"
          label={distance.text}
        />
      </div>
      {distance.value ? <p className="text-lg">{words.between(distance.low, distance.high)}</p> : null}
      {distance.note ? <p className="text-vermilion">{distance.note}</p> : null}
      <button type="button" onClick={onHow} className="target-mm-14 border-2 border-ink px-6 font-head text-lg">
        {words.how}
      </button>
    </div>
  );
}
