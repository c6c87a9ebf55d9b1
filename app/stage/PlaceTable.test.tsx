import { renderToStaticMarkup } from "react-dom/server";
import { expect, test } from "vitest";
import { SceneDocument } from "#app/scene/document.ts";
import type { CastMember } from "#app/scene/member.ts";
import { PlaceTable } from "./PlaceTable.tsx";
import { VolumeStage } from "./VolumeStage.tsx";

const document = SceneDocument.parse({ kind: "volume" });
const member = (name: string, pc: number | null): CastMember => ({
  recordId: name,
  name,
  raDeg: 192.85948,
  decDeg: 27.12825,
  distancePc: pc === null ? null : { value: pc, low: pc * 0.99, high: pc * 1.01 },
  regime: pc === null ? null : "firm",
  bv: null,
  vMag: null,
  labelled: true,
});

test("the table names the nearest first and gives the Galactic pole its latitude of 90 degrees", () => {
  // The pole's ICRS place: ESA SP-1200 (1997), volume 1, section 1.5.3.
  const html = renderToStaticMarkup(
    <PlaceTable document={document} members={[member("Far", 40), member("Near", 10)]} language="en" />,
  );
  expect(html.indexOf("Near")).toBeLessThan(html.indexOf("Far"));
  expect(html).toContain("90.0°");
  expect(html).toContain("32.6");
});

test("one who has no distance is in the table with the reason", () => {
  const html = renderToStaticMarkup(<PlaceTable document={document} members={[member("Lost", null)]} language="fr" />);
  expect(html).toContain("Lost");
  expect(html).toMatch(/colSpan="4">[^<]{10,}/i);
});

test("without scripts a stage is its still with the words for it, and no button that does nothing", () => {
  const html = renderToStaticMarkup(
    <VolumeStage
      document={document}
      members={[member("Near", 10)]}
      language="en"
      stillUrl="/still.png"
      stillAlt="One star near the Sun."
    />,
  );
  expect(html).toContain('<img src="/still.png" alt="One star near the Sun."');
  expect(html).not.toMatch(/<button|<canvas|role="application"/);
});
