import { expect, test } from "vitest";
import { regimeOf } from "#app/astrometry/parallax.ts";
import { AddMeasurement } from "#app/catalogue/measurement-input.ts";
import { CreateRecord } from "#app/catalogue/record-input.ts";
import { parseInput } from "#app/parse-input.ts";
import { valuesOf } from "./catalogue.ts";
import { FAMILIAR_PATTERN, NEAREST_SUNS } from "./exhibits.ts";
import { STARS } from "./stars.ts";

const SOURCES = { hipparcos: "I/311", photometry: "I/239", gaia: "I/355" };
const measured = STARS.map((star) => ({
  star,
  values: valuesOf(star, SOURCES).map((value) => parseInput(AddMeasurement, { recordId: star.name, ...value })),
}));
const asRecord = ({ name, also, ids, ra, dec }: (typeof STARS)[number]) =>
  parseInput(CreateRecord, {
    name,
    kind: "star",
    otherNames: also,
    identifiers: ids,
    ra,
    dec,
    positionEpoch: "2000.0",
  });

test("there are at least 64 stars, and no two share a name or an identifier", () => {
  expect(STARS.length).toBeGreaterThanOrEqual(64);
  expect(new Set(STARS.map(({ name }) => name)).size).toBe(STARS.length);
  const ids = STARS.flatMap((star) =>
    asRecord(star).identifiers.map(({ catalogue, value }) => `${catalogue} ${value}`),
  );
  expect(ids.filter((id, at) => ids.indexOf(id) !== at)).toEqual([]);
});

test("every star has a place in the sky, and no two stand in the same one", () => {
  const places = STARS.map((star) => asRecord(star)).map(({ ra, dec }) => {
    if (!ra || !dec) throw new Error("A star has no position.");
    expect(ra.deg).toBeGreaterThanOrEqual(0);
    expect(ra.deg).toBeLessThan(360);
    expect(Math.abs(dec.deg)).toBeLessThanOrEqual(90);
    return `${ra.text} ${dec.text}`;
  });
  expect(new Set(places).size).toBe(STARS.length);
});

test("every star has a parallax above zero with an error, and a brightness", () => {
  for (const { star, values } of measured) {
    const parallaxes = values.filter(({ quantity }) => quantity === "parallax");
    expect(parallaxes.length, star.name).toBeGreaterThan(0);
    for (const { value, error } of parallaxes) {
      expect(Number(value), star.name).toBeGreaterThan(0);
      expect(Number(error), star.name).toBeGreaterThan(0);
    }
    expect(values.filter(({ quantity }) => quantity === "magnitude-v").length, star.name).toBe(1);
  }
});

test("every value cites its place in a source, or says that it is from memory", () => {
  for (const { star, values } of measured) {
    for (const { fromMemory, note, sourceId, locator } of values) {
      if (fromMemory) expect(note, star.name).toBe("from memory");
      else expect([sourceId, locator], star.name).toEqual([expect.any(String), expect.any(String)]);
    }
  }
});

test("what is compared is adopted: the first parallax of a checked star is not from memory, and no other's is", () => {
  for (const { star, values } of measured) expect(values[0]?.fromMemory, star.name).toBe(!star.checked);
});

test("the two parallaxes of a star speak of the same star", () => {
  for (const { hipparcos, gaia, name } of STARS) {
    if (!hipparcos || !gaia) continue;
    const [one = 0, other = 0] = [hipparcos, gaia].map((text) => Number.parseFloat(text));
    expect(Math.abs(one / other - 1), name).toBeLessThan(0.05);
  }
});

test("all three regimes are there, and the seven of the Plough", () => {
  const regimes = STARS.flatMap(({ hipparcos }) => {
    const [parallax = 0, error = 0] = hipparcos?.split(" ± ").map(Number) ?? [];
    return hipparcos ? [regimeOf(parallax, error)] : [];
  });
  expect(new Set(regimes)).toEqual(new Set(["firm", "wide", "prior-led"]));
  expect(FAMILIAR_PATTERN.scenes[0]?.cast.every((name) => STARS.some((star) => star.name === name))).toBe(true);
});

test("the exhibit that is published casts compared stars only", () => {
  const checked = new Set(STARS.filter((star) => star.checked).map(({ name }) => name));
  const cast = NEAREST_SUNS.scenes.flatMap((scene) => scene.cast);
  expect(cast.filter((name) => !checked.has(name))).toEqual([]);
});
