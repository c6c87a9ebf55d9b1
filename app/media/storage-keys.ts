import type { VariantFormat } from "#app/database/enums.ts";

export const originalKey = (digest: string) => `originals/${digest}`;
export const variantKey = (digest: string, format: VariantFormat) => `variants/${digest}.${format}`;
