import { expect, test } from "vitest";
import { isBibcode } from "./bibcode.ts";
import { fullCitation, shortCitation } from "./citation.ts";
import { isDoi, plainDoi } from "./doi.ts";

// Codes printed by ADS for the papers that METHODS.md cites (from memory, each of 19 characters).
test.each([
  "2007A&A...474..653V",
  "1997A&A...323L..49P",
  "2016A&A...595A...2G",
  "2015PASP..127..994B",
  "1973PASP...85..573L",
  "2019Natur.567..200P",
  "2021A&A...649A...2L",
  "1997ESASP1200.....E",
])("%s is a bibcode", (code) => {
  expect(isBibcode(code)).toBe(true);
});

test.each([
  "",
  "2007A&A...474..653",
  "2007A&A...474..653VV",
  "07A&A...474..653Vxx",
  "2007 A&A..474..653V",
  "1007A&A...474..653V",
  "2007.A&A..474..653V",
  "2007A.A...474..653V",
  "2007.....474..653Vx",
  "2007A&A...474..653v",
  "2007A&A..._74..653V",
])("%j is none", (code) => {
  expect(isBibcode(code)).toBe(false);
});

// DOIs of two papers that METHODS.md cites, and the example of the DOI Handbook (10.1000/182).
test("DOIs are taken as people paste them", () => {
  for (const text of ["10.1051/0004-6361:20078357", "10.1086/683116", "10.1000/182"]) expect(isDoi(text)).toBe(true);
  expect(plainDoi(" https://doi.org/10.1051/0004-6361:20078357 ")).toBe("10.1051/0004-6361:20078357");
  expect(plainDoi("doi:10.1086/ABC")).toBe("10.1086/abc");
  for (const text of ["11.1051/x", "10.10/x", "10.1051/", "10.1051/a b", "vanLeeuwen2007"])
    expect(isDoi(text)).toBe(false);
});

test("a source is cited in short and in full", () => {
  const source = {
    authors: "van Leeuwen, F.",
    year: 2007,
    title: "Validation of the new Hipparcos reduction",
    designation: "I/311",
  };
  expect(shortCitation(source)).toBe("van Leeuwen 2007, I/311");
  expect(fullCitation(source)).toBe("van Leeuwen, F. (2007). Validation of the new Hipparcos reduction [I/311].");
  expect(shortCitation({ ...source, authors: "Perryman, M. A. C.; Lindegren, L.", designation: null })).toBe(
    "Perryman et al. 2007",
  );
});
