import { z } from "zod";
import { FIGURE_FORMS, FIGURE_QUANTITIES, FIGURE_UNITS } from "#app/database/enums.ts";
import { version } from "./exhibit-input.ts";
import { FIGURE_KEY } from "./words.ts";

const body = z.string().max(8000, "At most 8000 characters.").default("");

export const SaveWords = z.object({ sceneId: z.string(), version, en: body, fr: body });

export const BindFigure = z.object({
  sceneId: z.string(),
  version,
  key: z
    .string()
    .trim()
    .regex(FIGURE_KEY, "A small letter first, then small letters, digits or hyphens, at most 40, such as vega."),
  recordId: z.string().min(1, "Choose whose number it is."),
  quantity: z.enum(FIGURE_QUANTITIES),
  unit: z.enum(FIGURE_UNITS),
  form: z.enum(FIGURE_FORMS),
});

export const UnbindFigure = z.object({ sceneId: z.string(), version, key: z.string() });
