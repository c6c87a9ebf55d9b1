import { expect, test } from "vitest";
import { AddMeasurement } from "#app/catalogue/measurement-input.ts";
import { parseInput } from "#app/parse-input.ts";
import { SAID, saidOfMeasurement } from "./said.ts";

test.each([
  ["parallax", "130.23 ± 0.36", "mas", "measured-firm"],
  ["parallax", "5.95 ± 0.85", "mas", "measured-wide"],
  ["parallax", "5 ± 1.5", "mas", "measured-prior-led"],
  ["parallax", "-0.4 ± 0.9", "mas", "measured-prior-led"],
  ["parallax", "0 ± 0.9", "mas", "measured-prior-led"],
  ["parallax", "0.00595 ± 0.00085", "arcsec", "measured-wide"],
  ["parallax", "5.2", "mas", "measured-no-error"],
  ["magnitude-v", "0.03", "mag", "measured"],
])("after proposing %s %s %s the page tells what may be said of it", (quantity, printed, unit, word) => {
  const measured = parseInput(AddMeasurement, { recordId: "r", quantity, printed, unit });
  expect(saidOfMeasurement(measured)).toBe(word);
  expect(SAID[word]).toBeDefined();
});
