import { linearFromHex } from "#app/raster/colour.ts";

/** The stage's colours, the night table of the style sheet, in linear light. */
export const NIGHT = linearFromHex("#0a0f1c");
export const STARLIGHT = linearFromHex("#f5f1e8");
export const STARLIGHT_SOFT = linearFromHex("#b5b1a8");
export const RING = linearFromHex("#39446b");
export const RING_LABEL = linearFromHex("#8f98b5");
export const STEM = linearFromHex("#2b3450");
export const VERMILION = linearFromHex("#f07a60");
