import greekBody from "@fontsource/source-sans-3/files/source-sans-3-greek-400-normal.woff?url&no-inline";
import greekHead from "@fontsource/source-sans-3/files/source-sans-3-greek-600-normal.woff?url&no-inline";
import latinBody from "@fontsource/source-sans-3/files/source-sans-3-latin-400-normal.woff?url&no-inline";
import latinExtBody from "@fontsource/source-sans-3/files/source-sans-3-latin-ext-400-normal.woff?url&no-inline";
import latinHead from "@fontsource/space-grotesk/files/space-grotesk-latin-500-normal.woff?url&no-inline";
import latinExtHead from "@fontsource/space-grotesk/files/space-grotesk-latin-ext-500-normal.woff?url&no-inline";
import { useEffect, useState } from "react";
import { type Fonts, parseFont } from "#app/raster/font.ts";

// The same files in the same order as faces.ts names for the server; faces.test.ts holds them together.
const HEAD = [latinHead, latinExtHead, greekHead];
const BODY = [latinBody, latinExtBody, greekBody];

let loading: Promise<Fonts> | null = null;

async function fetchFont(url: string) {
  const answer = await fetch(url);
  if (!answer.ok) throw new Error(`the face ${url} did not come: ${answer.status}`);
  return parseFont(await answer.arrayBuffer());
}

async function fetchFonts(): Promise<Fonts> {
  const [head, body] = await Promise.all([Promise.all(HEAD.map(fetchFont)), Promise.all(BODY.map(fetchFont))]);
  return { head, body };
}

/** The stage's faces, fetched once a page; null until they are there, and where they never come. */
export function useFonts(): Fonts | null {
  const [fonts, setFonts] = useState<Fonts | null>(null);
  useEffect(() => {
    let wanted = true;
    loading ??= fetchFonts();
    loading.then(
      (found) => wanted && setFonts(found),
      () => {
        loading = null;
      },
    );
    return () => {
      wanted = false;
    };
  }, []);
  return fonts;
}
