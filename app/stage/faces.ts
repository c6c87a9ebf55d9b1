/** The faces of the stage, first choice first. Greek, for Bayer letters, comes from the running face. */
export const FACES = {
  head: [
    "@fontsource/space-grotesk/files/space-grotesk-latin-500-normal.woff",
    "@fontsource/space-grotesk/files/space-grotesk-latin-ext-500-normal.woff",
    "@fontsource/source-sans-3/files/source-sans-3-greek-600-normal.woff",
  ],
  body: [
    "@fontsource/source-sans-3/files/source-sans-3-latin-400-normal.woff",
    "@fontsource/source-sans-3/files/source-sans-3-latin-ext-400-normal.woff",
    "@fontsource/source-sans-3/files/source-sans-3-greek-400-normal.woff",
  ],
} as const;
