import { useEffect, useState } from "react";
import type { DistanceReply } from "#app/catalogue/answer-distance.ts";
import { percentText } from "#app/figures/office-numbers.ts";
import { SpreadBar } from "#app/ui/SpreadBar.tsx";
import { REGIME_WORDS } from "./words.ts";

interface Asked {
  parallax: string;
  error: string;
  prior: string;
  scale: string;
}

type Heard = { reply: DistanceReply } | { refusal: string } | null;

const PAUSE_MS = 250;

function addressOf({ parallax, error, prior, scale }: Asked): string | null {
  if (parallax.trim() === "" || error.trim() === "") return null;
  const query = new URLSearchParams({ parallax, error });
  if (prior && prior !== "none") query.set("prior", prior);
  if (scale.trim()) query.set(prior === "edsd" ? "length" : "limit", scale);
  return `/api/distance?${query}`;
}

/** Asks /api/distance a moment after the last key; an answer that was overtaken is dropped. */
function useDistance(asked: Asked): Heard {
  const [heard, setHeard] = useState<Heard>(null);
  const address = addressOf(asked);
  useEffect(() => {
    if (!address) {
      setHeard(null);
      return;
    }
    const overtaken = new AbortController();
    const wait = setTimeout(async () => {
      try {
        const response = await fetch(address, { signal: overtaken.signal });
        const body = await response.json();
        setHeard(response.ok ? { reply: body } : { refusal: body.errors?.[0]?.message ?? body.detail });
      } catch {
        if (!overtaken.signal.aborted) setHeard({ refusal: "The distance could not be asked for just now." });
      }
    }, PAUSE_MS);
    return () => {
      clearTimeout(wait);
      overtaken.abort();
    };
  }, [address]);
  return heard;
}

/** What would follow from what is being typed. Says nothing until there is a parallax with its error. */
export function LiveDistance(asked: Asked) {
  const heard = useDistance(asked);
  return (
    <div aria-live="polite" className="min-h-16 border-l border-rule pl-4">
      {heard === null ? (
        <p className="text-sm text-ink-soft">The distance that follows appears here while you type.</p>
      ) : "refusal" in heard ? (
        <p className="text-sm text-vermilion">{heard.refusal}</p>
      ) : (
        <Reply reply={heard.reply} />
      )}
    </div>
  );
}

function Reply({ reply }: { reply: DistanceReply }) {
  const { regime, fractionalError, ly, text, reason, warning } = reply;
  return (
    <>
      <p className="label">
        {REGIME_WORDS[regime]}
        {fractionalError !== null && fractionalError > 0
          ? `, the error is ${percentText(fractionalError, "en")} of the parallax`
          : ""}
      </p>
      {text ? <p className="font-head text-lg">{text.en}</p> : null}
      {text ? <p className="text-sm text-ink-soft">fr {text.fr}</p> : null}
      {ly && text ? (
        <div className="mt-2 max-w-96">
          <SpreadBar
            value={regime === "firm" ? ly.value : undefined}
            low={ly.low}
            high={ly.high}
            low90={ly.low90}
            high90={ly.high90}
            label={text.en}
          />
        </div>
      ) : null}
      {reason ? <p>{reason}</p> : null}
      {warning ? <p className="text-vermilion">{warning}</p> : null}
    </>
  );
}
