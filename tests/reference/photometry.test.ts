import { test } from "vitest";
import { linearSrgbFromTemperature, temperatureFromBv } from "#app/astrometry/photometry.ts";
import { checkAll, expectClose } from "./check.ts";
import { readTable } from "./table.ts";

type Temperature = { what: "temperature"; bv: number; kelvin: number };
type Colour = { what: "colour"; kelvin: number; fitted: number[]; tabulated: number[] };

const { cases } = readTable<Temperature | Colour>("photometry");
const colours = cases.filter((one) => one.what === "colour");

// One formula of five operations on both sides; near its pole the subtraction loses two digits.
test("temperatures from B-V follow Ballesteros 2012", () => {
  const temperatures = cases.filter((one) => one.what === "temperature");
  checkAll(temperatures, ({ bv, kelvin }) => {
    expectClose(temperatureFromBv(bv), kelvin, 1e-12);
  });
});

// One sum a nanometre against adaptive quadrature of the same fit: the fit's curvature jumps at its lobes' tops, which
// costs the sum some 1e-6; a screen shows steps of 4e-3.
test("black body colours agree with adaptive quadrature of the same observer", () => {
  checkAll(colours, ({ kelvin, fitted }) => {
    linearSrgbFromTemperature(kelvin).forEach((channel, i) => {
      expectClose(channel, fitted[i]!, 1e-5, 1);
    });
  });
});

// The published fit is within about 0.02 of the observer's own table (CIE 15:2004) from 1000 K up: the largest
// departure, near 1000 K, where all the light is in the red tail, is 0.0199 of the largest channel.
test("black body colours stay within 0.02 of the observer's table", () => {
  checkAll(colours, ({ kelvin, tabulated }) => {
    linearSrgbFromTemperature(kelvin).forEach((channel, i) => {
      expectClose(channel, tabulated[i]!, 0.02, 1);
    });
  });
});
