import { z } from "zod";
import { requireBounded, requirePositive } from "#app/astrometry/bounds.ts";
import type { Prior } from "#app/astrometry/posterior.ts";
import { plainNumberText } from "./printed-value.ts";

/** Whole-sky default of Astraatmadja & Bailer-Jones 2016 (ApJ 832, 137; from memory), pc. */
export const DEFAULT_LENGTH_PC = 1350;

const PRIORS = ["edsd", "uniform-density", "uniform-distance"] as const satisfies Prior["name"][];
const isPrior = (name: string): name is Prior["name"] => PRIORS.some((prior) => prior === name);

const once = (parameter: string) =>
  z
    .string({
      error: ({ input }) => `${parameter} is ${Array.isArray(input) ? "given more than once" : "missing"}.`,
    })
    .trim()
    .max(64, `${parameter} has more than 64 characters.`);

/** Decimal text within what astrometry computes with. */
const number = (parameter: string, require: (name: string, value: number) => void) =>
  once(parameter)
    .min(1, `${parameter} is missing.`)
    .transform((text, context) => {
      try {
        const value = Number(plainNumberText(text));
        require(parameter, value);
        return value;
      } catch (problem) {
        if (!(problem instanceof RangeError)) throw problem;
        context.addIssue({ code: "custom", message: problem.message.replace(/\.?$/, ".") });
        return z.NEVER;
      }
    });

/** A parameter left blank, as an empty field of a form leaves it, is not given. */
const optional = <S extends z.ZodType>(schema: S) =>
  z.preprocess((given) => (typeof given === "string" && given.trim() === "" ? undefined : given), schema.optional());

const prior = once("prior").transform((name, context): Prior["name"] | undefined => {
  if (name === "none") return undefined;
  if (isPrior(name)) return name;
  context.addIssue({ code: "custom", message: `“${name}” is no prior: ${PRIORS.join(", ")} or none.` });
  return z.NEVER;
});

/**
 * What GET /api/distance is asked: parallax and error in mas; prior with its length or limit in pc. A length or limit that the
 * prior does not use must make sense too, and changes nothing: the answer names the prior that was used.
 */
export const DistanceQuery = z
  .object({
    parallax: number("parallax", requireBounded),
    error: number("error", requirePositive),
    prior: optional(prior),
    length: optional(number("length", requirePositive)),
    limit: optional(number("limit", requirePositive)),
  })
  .catchall(z.unknown().refine(() => false, "No such parameter: there are parallax, error, prior, length and limit."))
  .refine(({ prior, limit }) => !prior?.startsWith("uniform-") || limit !== undefined, {
    path: ["limit"],
    error: "limit is missing: a uniform prior needs the distance up to which it is uniform, in pc.",
    // Said together with what is wrong elsewhere.
    when: ({ value }) => typeof (value as { prior?: unknown }).prior === "string",
  })
  .transform(({ parallax, error, prior, length, limit }) => ({
    parallaxMas: parallax,
    errorMas: error,
    prior: priorFrom(prior, length, limit),
    lengthIsDefault: prior === "edsd" && length === undefined,
  }));

export type DistanceQuestion = z.output<typeof DistanceQuery>;

function priorFrom(name: Prior["name"] | undefined, length = DEFAULT_LENGTH_PC, limit = Number.NaN): Prior | null {
  if (!name) return null;
  return name === "edsd" ? { name, lengthPc: length } : { name, limitPc: limit };
}

/** The parameters of an address; one that comes several times is an array, which DistanceQuery refuses by its name. */
export function queryParameters(search: URLSearchParams): Record<string, string | string[]> {
  const names = [...new Set(search.keys())];
  return Object.fromEntries(
    names.map((name) => {
      const values = search.getAll(name);
      return [name, values.length === 1 ? values[0]! : values];
    }),
  );
}
