import { expect, test } from "vitest";
import { knownUnit, toCanonical } from "./quantities.ts";

test("a unit moves the decimal point of what was printed and rounds nothing", () => {
  expect(toCanonical("parallax", "0.13023", "arcsec")).toBe(130.23);
  expect(toCanonical("parallax", "130230", "uas")).toBe(130.23);
  expect(toCanonical("parallax", "-4e-1", "mas")).toBe(-0.4);
  expect(toCanonical("parallax", "1.3023E-1", "arcsec")).toBe(130.23);
  expect(toCanonical("radial-velocity", "-13900", "m/s")).toBe(-13.9);
  expect(toCanonical("proper-motion-dec", "0.28623", "arcsec/yr")).toBe(286.23);
});

test("spellings of catalogues are read as the unit they mean, and only where the quantity has it", () => {
  expect(knownUnit("parallax", "Angle[mas]")).toBe("mas");
  expect(knownUnit("parallax", "μas")).toBe("uas");
  expect(knownUnit("proper-motion-ra", "mas.yr**-1")).toBe("mas/yr");
  expect(knownUnit("radial-velocity", "km.s**-1")).toBe("km/s");
  for (const unit of ["mag", "furlong", "", "constructor"]) expect(knownUnit("parallax", unit)).toBeNull();
});
