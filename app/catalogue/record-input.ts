import { z } from "zod";
import { parseDeclination, parseRightAscension } from "#app/astrometry/coordinates.ts";
import { LANGUAGES, PRIORS, RECORD_KINDS } from "#app/database/enums.ts";
import { julianEpoch, optionalText } from "#app/input-fields.ts";

const angle = (parse: (text: string) => number) =>
  z
    .string()
    .trim()
    .max(40, "At most 40 characters.")
    .default("")
    .transform((text, context) => {
      if (text === "") return null;
      try {
        return { text, deg: parse(text) };
      } catch (problem) {
        context.addIssue({ code: "custom", message: problem instanceof Error ? problem.message : "Not an angle." });
        return z.NEVER;
      }
    });

/** One other name a line: "fr: Véga", or "α Lyrae" for every language. */
export interface OtherName {
  language: (typeof LANGUAGES)[number] | null;
  name: string;
}

const NAME_LINE = /^(?:([a-z]{2})\s*:)?\s*(.*)$/;
const isLanguage = (text: string): text is (typeof LANGUAGES)[number] => LANGUAGES.some((one) => one === text);

/** @throws RangeError that says what is wrong with the line */
function parseNameLine(line: string): OtherName {
  const [, language, name = line] = NAME_LINE.exec(line) ?? [];
  if (language && !isLanguage(language)) {
    throw new RangeError(`“${line}”: names are kept in the languages ${LANGUAGES.join(", ")}.`);
  }
  if (name === "") throw new RangeError(`“${line}” has no name behind the language.`);
  if (name.length > 120) throw new RangeError(`“${name.slice(0, 30)}…” is longer than 120 characters.`);
  return { language: language && isLanguage(language) ? language : null, name };
}

const otherNames = z
  .string()
  .max(2000, "At most 2000 characters.")
  .default("")
  .transform((text, context): OtherName[] =>
    lines(text).flatMap((line) => {
      try {
        return [parseNameLine(line)];
      } catch (problem) {
        if (!(problem instanceof RangeError)) throw problem;
        context.addIssue({ code: "custom", message: problem.message });
        return [];
      }
    }),
  );

export interface Identifier {
  catalogue: string;
  value: string;
}

/** Catalogues whose identifiers are recognised: how they are written here, and what their numbers look like. */
const CATALOGUES: [name: string, pattern: RegExp][] = [
  ["Gaia DR3", /^gaia\s*dr3\s*(\d{5,19})$/i],
  ["HIP", /^hip\s*(\d{1,6})$/i],
  ["HD", /^hd\s*(\d{1,6})$/i],
  ["HR", /^hr\s*(\d{1,4})$/i],
  ["GJ", /^(?:gj|gl|gliese)\s*(\d{1,4}(?:\.\d+)?\s?[A-D]?)$/i],
  ["M", /^(?:m|messier)\s*(\d{1,3})$/i],
  ["NGC", /^ngc\s*(\d{1,4})$/i],
  ["IC", /^ic\s*(\d{1,4})$/i],
];

/** @returns null when the catalogue is not one that is known */
export function parseIdentifier(text: string): Identifier | null {
  for (const [catalogue, pattern] of CATALOGUES) {
    const value = pattern.exec(text.trim())?.[1];
    if (value)
      return {
        catalogue,
        value: value
          .replace(/\s+/g, "")
          .toUpperCase()
          .replace(/^0+(?=\d)/, ""),
      };
  }
  return null;
}

function lines(text: string): string[] {
  return text
    .split(/\r?\n|;/)
    .map((line) => line.trim())
    .filter(Boolean);
}

const identifiers = z
  .string()
  .max(1000, "At most 1000 characters.")
  .default("")
  .transform((text, context): Identifier[] =>
    lines(text).flatMap((line) => {
      const parsed = parseIdentifier(line);
      if (parsed) return [parsed];
      const known = CATALOGUES.map(([name]) => name).join(", ");
      context.addIssue({ code: "custom", message: `“${line}” is no identifier of a catalogue known here (${known}).` });
      return [];
    }),
  );

const fields = {
  name: z.string().trim().min(1, "Give it a name.").max(120, "At most 120 characters."),
  kind: z.enum(RECORD_KINDS),
  otherNames,
  identifiers,
  ra: angle(parseRightAscension),
  dec: angle(parseDeclination),
  positionEpoch: julianEpoch,
  positionSourceId: optionalText(26),
  positionLocator: optionalText(200),
  positionNote: optionalText(500),
};

const wholePosition = (input: { ra: unknown; dec: unknown }) => (input.ra === null) === (input.dec === null);
const HALF = { path: ["dec"], error: "A position is both: right ascension and declination." };

/** Made with the form: the record's id, so that a form sent twice keeps one record. */
const submission = z
  .string()
  .regex(/^[0-9A-HJKMNP-TV-Z]{26}$/, "Open the form again.")
  .optional();

export const CreateRecord = z.object({ ...fields, submission }).refine(wholePosition, HALF);
export const version = z.coerce.number().int().positive();
export const EditRecord = z.object({ recordId: z.string(), version, ...fields }).refine(wholePosition, HALF);

const positive = z
  .string()
  .trim()
  .default("")
  .transform((text, context) => {
    if (text === "") return null;
    const value = Number(text);
    if (Number.isFinite(value) && value > 0) return value;
    context.addIssue({ code: "custom", message: "A length in parsec above zero." });
    return z.NEVER;
  });

export const AdoptParallax = z
  .object({
    recordId: z.string(),
    version,
    measurementId: z.string().min(1, "Choose a measurement."),
    reason: z.string().trim().min(1, "Say why this one.").max(1000, "At most 1000 characters."),
    prior: z.enum(["none", ...PRIORS]).default("none"),
    priorScalePc: positive,
    priorReason: optionalText(1000),
  })
  .superRefine((input, context) => {
    if (input.prior === "none") return;
    if (input.priorScalePc === null) {
      const what = input.prior === "edsd" ? "the prior's length" : "the prior's limit";
      context.addIssue({ code: "custom", path: ["priorScalePc"], message: `Give ${what} in parsec.` });
    }
    if (!input.priorReason) {
      context.addIssue({ code: "custom", path: ["priorReason"], message: "Say why this prior." });
    }
  });

export const VetRecord = z.object({
  recordId: z.string(),
  version,
  /** The ledger as the scientist saw it (ledger-mark.ts): what came to it since is not vetted unseen. */
  ledger: z.string().optional(),
});
export const UnvetRecord = z.object({
  recordId: z.string(),
  version,
  reason: z.string().trim().min(1, "Say why.").max(1000, "At most 1000 characters."),
});
