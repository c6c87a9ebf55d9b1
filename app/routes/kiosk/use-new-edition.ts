import { useEffect, useRef, useState } from "react";

const ASK_EVERY_MS = 10_000;

/**
 * Asks the feed, with its ETag, whether there is a newer edition. An unanswered question changes nothing: what is on the
 * screen stays on the screen.
 * @param exhibit null: no feed to ask
 * @returns true once another edition than the one shown is there
 */
export function useNewEdition(exhibit: string | null, shown: number | null): boolean {
  const [newest, setNewest] = useState<number | null>(null);
  const tag = useRef<string | null>(null);
  useEffect(() => {
    if (!exhibit) return;
    const ask = async () => {
      try {
        const headers: Record<string, string> = tag.current ? { "If-None-Match": tag.current } : {};
        const response = await fetch(`/feed/${exhibit}.json`, { headers, cache: "no-store" });
        if (response.status !== 200) return;
        tag.current = response.headers.get("ETag");
        const feed = (await response.json()) as { _alidade?: { edition?: number } };
        setNewest(feed._alidade?.edition ?? null);
      } catch {
        // No network just now: ask again next time.
      }
    };
    const timer = setInterval(ask, ASK_EVERY_MS);
    return () => clearInterval(timer);
  }, [exhibit]);
  return newest !== null && newest !== shown;
}
