import { test } from "vitest";
import { angularSeparationDeg, galacticXyz, icrsToGalactic } from "#app/astrometry/coordinates.ts";
import { checkAll, expectClose } from "./check.ts";
import { readTable } from "./table.ts";

interface Case {
  raDeg: number;
  decDeg: number;
  lDeg: number;
  bDeg: number;
  distance: number;
  x: number;
  y: number;
  z: number;
  otherRaDeg: number;
  otherDecDeg: number;
  separationDeg: number;
}

// The same matrix and the same arithmetic as ERFA: 1e-12 leaves room for the order of a few roundings. Close to zero an
// angle is compared to one degree and a coordinate to the distance, for those are what its rounding is a share of.
const TOLERANCE = 1e-12;
const DEG = Math.PI / 180;

test("Galactic longitude and latitude agree with ERFA's icrs2g", () => {
  checkAll(readTable<Case>("galactic").cases, (one) => {
    const { lDeg, bDeg } = icrsToGalactic(one.raDeg, one.decDeg);
    expectClose(bDeg, one.bDeg, TOLERANCE, 1);
    // Round a pole longitude runs together: what counts is the arc along the parallel, by the shorter way.
    const along = ((lDeg - one.lDeg + 540) % 360) - 180;
    expectClose(along * Math.cos(bDeg * DEG), 0, TOLERANCE, Math.max(one.lDeg, 1));
  });
});

test("Galactic XYZ agree with ERFA's", () => {
  checkAll(readTable<Case>("galactic").cases, (one) => {
    const { x, y, z } = galacticXyz(one.raDeg, one.decDeg, one.distance);
    expectClose(x, one.x, TOLERANCE, one.distance);
    expectClose(y, one.y, TOLERANCE, one.distance);
    expectClose(z, one.z, TOLERANCE, one.distance);
  });
});

test("separations agree with ERFA's seps, near pairs and far", () => {
  checkAll(readTable<Case>("galactic").cases, (one) => {
    const found = angularSeparationDeg(one.raDeg, one.decDeg, one.otherRaDeg, one.otherDecDeg);
    expectClose(found, one.separationDeg, TOLERANCE, 1);
  });
});
