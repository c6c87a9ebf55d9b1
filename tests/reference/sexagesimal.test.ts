import { test } from "vitest";
import { parseDeclination, parseRightAscension } from "#app/astrometry/coordinates.ts";
import { checkAll, expectClose } from "./check.ts";
import { readTable } from "./table.ts";

interface Case {
  kind: "ra" | "dec";
  text: string;
  expectedDeg: number;
}

// Three parts are summed and divided once; astropy sums three quotients. A few roundings, far below 1e-12.
const TOLERANCE = 1e-12;

test("right ascensions and declinations are read as astropy's Angle reads them", () => {
  checkAll(readTable<Case>("sexagesimal").cases, ({ kind, text, expectedDeg }) => {
    expectClose(kind === "ra" ? parseRightAscension(text) : parseDeclination(text), expectedDeg, TOLERANCE);
  });
});
