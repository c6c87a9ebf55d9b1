import { z } from "zod";
import { optionalText } from "#app/input-fields.ts";
import { isBibcode, plainBibcode, yearOfBibcode } from "./bibcode.ts";
import { isDoi, plainDoi } from "./doi.ts";

const fields = {
  designation: optionalText(80),
  title: z.string().trim().min(1, "Give its title.").max(400, "At most 400 characters."),
  authors: z
    .string()
    .trim()
    .min(1, "Give its authors: Family, Initials; Family, Initials.")
    .max(400, "At most 400 characters."),
  year: z.coerce.number("A year.").int("A year.").min(1500, "A year from 1500 on.").max(2100, "A year up to 2100."),
  bibcode: optionalText(40)
    .transform((text) => (text === null ? null : plainBibcode(text)))
    .refine((text) => text === null || isBibcode(text), {
      error: "A bibcode has 19 characters: YYYYJJJJJVVVVMPPPPA, such as 2007A&A...474..653V.",
    }),
  doi: optionalText(300)
    .transform((text) => (text === null ? null : plainDoi(text)))
    .refine((text) => text === null || isDoi(text), {
      error: "A DOI begins with 10., such as 10.1051/0004-6361:20078357.",
    }),
  note: optionalText(2000),
};

type Named = { bibcode: string | null; doi: string | null; year: number };

const named = (input: Named) => Boolean(input.bibcode ?? input.doi);
const UNNAMED = { path: ["bibcode"], error: "A bibcode or a DOI is needed, so that others can find it." };

const ofThatYear = ({ bibcode, year }: Named) =>
  bibcode === null || !isBibcode(bibcode) || yearOfBibcode(bibcode) === year;
const OTHER_YEAR = { path: ["year"], error: "The bibcode begins with another year. One of the two is mistyped." };

export const CreateSource = z.object(fields).refine(named, UNNAMED).refine(ofThatYear, OTHER_YEAR);
export const EditSource = z
  .object({ sourceId: z.string(), version: z.coerce.number().int().positive(), ...fields })
  .refine(named, UNNAMED)
  .refine(ofThatYear, OTHER_YEAR);
