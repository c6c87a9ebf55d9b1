import { createHash } from "node:crypto";
import sharp, { type Sharp } from "sharp";
import type { VariantFormat } from "#app/database/enums.ts";
import { Invalid } from "#app/errors.ts";

/** What sharp calls the formats that are taken, told by content and never by name. SVG is not one: it can hold scripts. */
const TAKEN: Record<string, string> = {
  jpeg: "image/jpeg",
  png: "image/png",
  webp: "image/webp",
  heif: "image/avif",
  tiff: "image/tiff",
};
const MOST_PIXELS = 50_000_000;
const LEAST_WIDTH = 320;
/** WebP ends at 16383 pixels (RFC 9649, section 3.4: 14 bits a side, from memory); six times the largest width stays below. */
const TALLEST = 6;
const WIDTHS = [480, 960, 1600, 2400];

export interface PictureFacts {
  mime: string;
  width: number;
  height: number;
}

export interface Variant {
  format: VariantFormat;
  width: number;
  height: number;
  bytes: Buffer;
  digest: string;
}

export const digestOf = (bytes: Uint8Array) => createHash("sha256").update(bytes).digest("hex");

const open = (bytes: Uint8Array) => sharp(bytes, { limitInputPixels: MOST_PIXELS, failOn: "error" });

/**
 * What a file is, by its content.
 * @throws Invalid at `file` when it is no picture that is taken, has too many pixels, or is too small
 */
export async function inspectPicture(bytes: Uint8Array): Promise<PictureFacts> {
  const refuse = (message: string): never => {
    throw new Invalid({ file: [message] });
  };
  const facts = await open(bytes)
    .metadata()
    .catch((error: Error) =>
      refuse(
        /pixel limit/i.test(error.message)
          ? "This picture has more than 50 million pixels. Make it smaller first."
          : "This file is no picture that can be read: JPEG, PNG, WebP, AVIF or TIFF.",
      ),
    );
  const mime = TAKEN[facts.format ?? ""];
  // HEIC of a telephone comes in the same wrapping as AVIF, with a code inside that cannot be read here.
  const foreign = facts.format === "heif" && facts.compression !== "av1";
  if (!mime || foreign) return refuse("This kind of file is not taken: JPEG, PNG, WebP, AVIF or TIFF.");
  if ((facts.pages ?? 1) > 1) return refuse("This file has several pages or moves. Send one picture.");
  const { width, height } = facts.autoOrient;
  if (width * height > MOST_PIXELS)
    return refuse("This picture has more than 50 million pixels. Make it smaller first.");
  if (width < LEAST_WIDTH)
    return refuse(`This picture is only ${width} pixels wide; at least ${LEAST_WIDTH} are needed.`);
  if (height > width * TALLEST)
    return refuse(`This picture is more than ${TALLEST} times as tall as wide. Crop it first.`);
  return { mime, width, height };
}

/** The widths a picture is kept in: the usual ones below its own, and its own where it is no larger than the largest. */
export function variantWidths(width: number): number[] {
  const smaller = WIDTHS.filter((one) => one < width);
  const largest = WIDTHS.at(-1) ?? width;
  return width <= largest ? [...smaller, width] : smaller;
}

/**
 * A picture in every width and format, upright and without what cameras write into files.
 * @throws Invalid at `file` when its data turn out to be broken
 */
export async function encodePicture(bytes: Uint8Array, width: number): Promise<Variant[]> {
  const variants: Variant[] = [];
  for (const target of variantWidths(width)) {
    const upright = await open(bytes)
      .autoOrient()
      .resize({ width: target })
      .toColourspace("srgb")
      .raw()
      .toBuffer({ resolveWithObject: true })
      .catch(() => {
        throw new Invalid({ file: ["The picture's data are broken, so it cannot be shown."] });
      });
    const { data, info } = upright;
    const raw = { width: info.width, height: info.height, channels: info.channels };
    for (const format of ["avif", "webp", "jpeg"] as const) {
      const encoded = await encode(sharp(data, { raw }), format);
      variants.push({ format, width: info.width, height: info.height, bytes: encoded, digest: digestOf(encoded) });
    }
  }
  return variants;
}

function encode(picture: Sharp, format: VariantFormat): Promise<Buffer> {
  // AVIF at its usual effort takes half a minute for a large picture.
  if (format === "avif") return picture.avif({ quality: 55, effort: 1 }).toBuffer();
  if (format === "webp") return picture.webp({ quality: 80, effort: 3 }).toBuffer();
  return picture.flatten({ background: "#ffffff" }).jpeg({ quality: 82, mozjpeg: true }).toBuffer();
}
