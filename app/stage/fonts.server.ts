import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { type Fonts, parseFont } from "#app/raster/font.ts";
import { FACES } from "./faces.ts";

const require = createRequire(import.meta.url);
let read: Fonts | null = null;

/** The faces of the stage from the installed packages, read once. */
export function stageFonts(): Fonts {
  read ??= { head: FACES.head.map(readFace), body: FACES.body.map(readFace) };
  return read;
}

function readFace(file: string) {
  const bytes = readFileSync(require.resolve(file));
  return parseFont(new Uint8Array(bytes).buffer);
}
