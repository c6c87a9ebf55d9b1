import { z } from "zod";

const title = z.string().trim().min(1, "Give it a title.").max(160, "At most 160 characters.");
const optionalTitle = z
  .string()
  .trim()
  .max(160, "At most 160 characters.")
  .transform((text) => text || null)
  .nullish()
  .transform((text) => text ?? null);

export const version = z.coerce.number().int().positive();

export const slug = z
  .string()
  .trim()
  .min(3, "At least 3 characters.")
  .max(60, "At most 60 characters.")
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, "Small letters, digits and single hyphens only, such as nearest-suns.");

export const CreateExhibit = z.object({ titleEn: title, titleFr: optionalTitle, slug });
export const RenameExhibit = z.object({ exhibitId: z.string(), version, titleEn: title, titleFr: optionalTitle });

export const AddScene = z.object({ exhibitId: z.string(), titleEn: title, titleFr: optionalTitle });
export const RemoveScene = z.object({ sceneId: z.string(), version });

/** The ids of all scenes (or cast members), in their new order. */
const order = z.preprocess((value) => (typeof value === "string" ? [value] : value), z.array(z.string()).min(1));
export const OrderScenes = z.object({ exhibitId: z.string(), version, order });
export const OrderCast = z.object({ sceneId: z.string(), version, order });

export const AddToCast = z.object({
  sceneId: z.string(),
  version,
  recordId: z.preprocess(
    (value) => (typeof value === "string" ? [value] : value),
    z.array(z.string().min(1, "Choose a record.")).min(1, "Choose a record."),
  ),
});
export const RemoveFromCast = z.object({ sceneId: z.string(), version, recordId: z.string() });
export const LabelCast = z.object({
  sceneId: z.string(),
  version,
  recordId: z.string(),
  labelled: z.enum(["yes", "no"]).transform((value) => value === "yes"),
});

export const SetSceneMedia = z.object({
  sceneId: z.string(),
  version,
  mediaId: z.string().transform((text) => text || null),
});
