/** What a route may say about its page: `export const handle: PageHandle = { ground: "night" }`. */
export interface PageHandle {
  /** "night" for the kiosk; the office stands on paper. */
  ground?: "paper" | "night";
  /** The page brings its own margins. */
  bleed?: boolean;
}

interface Match {
  handle?: unknown;
  loaderData?: unknown;
}

/** The innermost route that says something decides; a loader may return `language` ("fr") for a page that is not English. */
export function pageFacts(matches: readonly Match[]) {
  const facts = { ground: "paper", bleed: false, language: "en" };
  for (const { handle, loaderData } of matches) {
    if (isRecord(handle)) {
      if (handle.ground === "night" || handle.ground === "paper") facts.ground = handle.ground;
      if (typeof handle.bleed === "boolean") facts.bleed = handle.bleed;
    }
    if (isRecord(loaderData) && typeof loaderData.language === "string" && /^[a-z]{2}$/.test(loaderData.language)) {
      facts.language = loaderData.language;
    }
  }
  return facts;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === "object" && value !== null;
}
