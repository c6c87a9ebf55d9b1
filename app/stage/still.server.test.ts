import sharp from "sharp";
import { expect, test } from "vitest";
import { SceneDocument } from "#app/scene/document.ts";
import { renderStill } from "./still.server.ts";

const member = {
  recordId: "a",
  name: "β Tern",
  raDeg: 206.885,
  decDeg: 49.313,
  distancePc: { value: 31.87, low: 31.63, high: 32.11 },
  regime: "firm" as const,
  bv: 0.1,
  vMag: 1.9,
  labelled: true,
};
const document = SceneDocument.parse({ kind: "volume" });
const size = { width: 480, height: 270, language: "en" as const };

test("a still is a PNG of the size asked for, the night around it and light in it, the same bytes twice", async () => {
  const png = await renderStill(document, [member], size);
  const { data, info } = await sharp(png).raw().toBuffer({ resolveWithObject: true });
  expect([info.format, info.width, info.height, info.channels]).toEqual(["raw", 480, 270, 3]);
  expect([...data.subarray(0, 3)]).toEqual([10, 15, 28]);
  expect(data.reduce((most, byte) => Math.max(most, byte), 0)).toBeGreaterThan(240);
  expect(await renderStill(document, [member], size)).toEqual(png);
});

test("what is chosen, how it is turned and the language each change the picture", async () => {
  const pictures = await Promise.all([
    renderStill(document, [member], size),
    renderStill(document, [member], { ...size, selectedId: "a" }),
    renderStill(document, [member], { ...size, view: { azimuthDeg: 40 } }),
    renderStill(document, [member], { ...size, language: "fr" }),
    renderStill({ ...document, errorBars: false }, [member], { ...size, view: { distance: 0.5 } }),
  ]);
  expect(new Set(pictures.map((png) => png.toString("base64"))).size).toBe(5);
});
