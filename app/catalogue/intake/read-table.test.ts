import { expect, test } from "vitest";
import type { Invalid } from "#app/errors.ts";
import { recogniseAll } from "./meanings.ts";
import { readTable } from "./read-table.ts";

const read = (text: string) => readTable(new TextEncoder().encode(text));
const refusal = (bytes: Uint8Array | string) => {
  try {
    readTable(typeof bytes === "string" ? new TextEncoder().encode(bytes) : bytes);
  } catch (error) {
    return (error as Invalid).fields.file?.[0] ?? String(error);
  }
  return "accepted";
};

test("commas, semicolons and tabs are told apart; comments, a mark and a line of units are understood", () => {
  for (const delimiter of [",", ";", "\t"]) {
    const text = `\ufeff# from an archive\nname${delimiter}plx${delimiter}e_Plx\n${delimiter}mas${delimiter}mas\n----${delimiter}---${delimiter}---\nA${delimiter}1.0${delimiter}0.10\n`;
    const table = read(text);
    expect(table.columns).toEqual([
      { name: "name", unit: null, ucd: null },
      { name: "plx", unit: "mas", ucd: null },
      { name: "e_Plx", unit: "mas", ucd: null },
    ]);
    expect(table.rows).toEqual([{ number: 1, cells: ["A", "1.0", "0.10"] }]);
  }
});

test("quoted cells keep their delimiter, and rows of another width are kept for the dry run", () => {
  const { rows } = read('name,plx\n"Tern, the",1\nB\n');
  expect(rows.map((row) => row.cells)).toEqual([["Tern, the", "1"], ["B"]]);
});

// The shape of an IVOA VOTable 1.4 TABLEDATA serialisation (IVOA Recommendation VOTable 1.4, section 5.1).
const VOTABLE = `<?xml version="1.0"?>
<VOTABLE version="1.4" xmlns="http://www.ivoa.net/xml/VOTable/v1.3"><RESOURCE><TABLE>
<FIELD name="src" datatype="long" ucd="meta.id;meta.main"/>
<FIELD name="p" datatype="double" unit="mas" ucd="pos.parallax.trig"/>
<FIELD name="ep" datatype="double" unit="Angle[mas]" ucd="stat.error;pos.parallax.trig"/>
<DATA><TABLEDATA><TR><TD>5</TD><TD>1.5</TD><TD>0.2</TD></TR><TR><TD>6</TD><TD/><TD/></TR></TABLEDATA></DATA>
</TABLE></RESOURCE></VOTABLE>`;

test("a VOTable is read with names, units and UCDs", () => {
  const table = read(VOTABLE);
  expect(table.format).toBe("votable");
  expect(table.columns[1]).toEqual({ name: "p", unit: "mas", ucd: "pos.parallax.trig" });
  expect(table.rows.map((row) => row.cells)).toEqual([
    ["5", "1.5", "0.2"],
    ["6", "", ""],
  ]);
  expect(recogniseAll(table.columns).map((use) => use.meaning)).toEqual(["ignore", "parallax", "parallax-error"]);
});

test("columns are recognised by the names that archives give them", () => {
  const names = [
    "source_id",
    "ra",
    "dec",
    "parallax",
    "parallax_error",
    "pmra",
    "pmdec",
    "Vmag",
    "B-V",
    "HIP",
    "phase",
  ];
  expect(recogniseAll(names.map((name) => ({ name, unit: null, ucd: null }))).map((use) => use.meaning)).toEqual([
    "identifier",
    "ra",
    "dec",
    "parallax",
    "parallax-error",
    "proper-motion-ra",
    "proper-motion-dec",
    "magnitude-v",
    "colour-bv",
    "identifier",
    "ignore",
  ]);
});

test("XML with a DOCTYPE or entities of its own is refused at first sight", () => {
  const bomb = `<?xml version="1.0"?><!DOCTYPE v [<!ENTITY a "aaaa"><!ENTITY b "&a;&a;">]><VOTABLE>&b;</VOTABLE>`;
  expect(refusal(bomb)).toMatch(/DOCTYPE/);
  expect(refusal("<VOTABLE><TABLE>&outside;</TABLE></VOTABLE>")).toMatch(/broken/);
});

test("runaway depth, cells, foreign XML and other serialisations are refused with the reason", () => {
  expect(refusal(`<VOTABLE>${"<G>".repeat(100)}`)).toMatch(/nested deeper/);
  expect(refusal(`<VOTABLE><TABLE><FIELD name="a"/><DATA><TABLEDATA><TR><TD>${"x".repeat(5000)}</TD></TR>`)).toMatch(
    /longer than/,
  );
  expect(refusal("<html></html>")).toMatch(/no VOTable/);
  expect(refusal(VOTABLE.replace("TABLEDATA", "BINARY2").replace("/TABLEDATA", "/BINARY2"))).toMatch(/BINARY2/);
});

const MB10 = 10_485_760;
const binary = Uint8Array.from({ length: MB10 }, (_, at) => (at * 2_654_435_761) >>> 13);
const rubbish: [what: string, bytes: Uint8Array | string][] = [
  ["binary", binary],
  ["binary without a zero", binary.map((byte) => byte || 1)],
  ["binary of high bytes only", binary.map((byte) => byte | 0x80)],
  ["one line", "lorem ".repeat(1_700_000)],
  ["prose in lines", "lorem ipsum, dolor\nsit amet consectetur, a, b, c\nx\n".repeat(190_000)],
  ["commas", ",".repeat(10_000_000)],
  ["blank lines", "\n".repeat(MB10)],
  ["a quote never closed", `name,x\n"${"never closed ".repeat(800_000)}`],
  ["angle brackets", "<".repeat(MB10)],
  ["a DOCTYPE that never ends", `<!DOCTYPE a [${"x".repeat(MB10)}`],
];

test.each(rubbish)("10 MB of rubbish is refused in under a second: %s", (_what, content) => {
  const bytes = typeof content === "string" ? new TextEncoder().encode(content) : content;
  const began = performance.now();
  expect(refusal(bytes)).toMatch(
    /^This (is no text|cannot be read as CSV|file is empty|XML)|^The first line is longer/,
  );
  expect(performance.now() - began).toBeLessThan(1000);
});

test("a line of units is known also where other columns have units of their own; a row of data is not", () => {
  const { columns, rows } = read("Name\tPlx\tTeff\n\tmas\tK\nA\t5.0\t9602\n");
  expect(columns.map((column) => column.unit)).toEqual([null, "mas", "K"]);
  expect(rows).toHaveLength(1);
  expect(read("name,unit,plx\nA,mas,5\n").rows).toHaveLength(1);
});

test("tab-separated cells may hold bare quotation marks; text saved as UTF-16 is read", () => {
  expect(read(`name\tdec\nA\t-00° 30' 00"\n`).rows[0]?.cells).toEqual(["A", `-00° 30' 00"`]);
  const utf16 = new Uint8Array(Buffer.from("\ufeffname\tplx\nVéga\t130.23\n", "utf16le"));
  expect(readTable(utf16).rows[0]?.cells).toEqual(["Véga", "130.23"]);
});

// IVOA Recommendation VOTable 1.4, the VALUES element (from memory): its attribute null may name the value that stands for none.
test("what a VOTable says stands for nothing is nothing, in its own column only", () => {
  const field = '<FIELD name="p" datatype="double" unit="mas" ucd="pos.parallax.trig"';
  const text = VOTABLE.replace(`${field}/>`, `${field}><VALUES null="-99.9"/></FIELD>`)
    .replace("<TD>1.5</TD>", "<TD>-99.9</TD>")
    .replace("<TD>0.2</TD>", "<TD>-99.9</TD>");
  expect(read(text).rows[0]?.cells).toEqual(["5", "", "-99.9"]);
});

test("a unit that is none of the quantity's is not guessed away", () => {
  const unitOf = (unit: string | null) => recogniseAll([{ name: "parallax", unit, ucd: null }])[0]?.unit;
  expect(unitOf(null)).toBe("mas");
  expect(unitOf("Angle[mas]")).toBe("mas");
  expect(unitOf("arcsec")).toBe("arcsec");
  expect(unitOf("furlong")).toBeNull();
});

// UCD1+ words of the IVOA's controlled vocabulary, and two of the older UCD1.
test("columns with names of their own are recognised by their UCD", () => {
  const ucds = [
    "stat.error;pos.parallax",
    "pos.eq.ra;meta.main",
    "pos.eq.dec",
    "pos.pm;pos.eq.ra",
    "spect.dopplerVeloc.opt",
    "phot.mag;em.opt.V",
    "phot.color;em.opt.B;em.opt.V",
    "POS_PARLX_TRIG",
    "stat.error;pos.eq.ra",
    "meta.id;meta.main",
  ];
  const columns = ucds.map((ucd, at) => ({ name: `c${at}`, unit: null, ucd }));
  expect(recogniseAll(columns).map((use) => use.meaning)).toEqual([
    "parallax-error",
    "ra",
    "dec",
    "proper-motion-ra",
    "radial-velocity",
    "magnitude-v",
    "colour-bv",
    "parallax",
    "ignore",
    "ignore",
  ]);
});

test("a file without a head, without rows, or with two columns of one name is refused", () => {
  expect(refusal("")).toMatch(/empty/);
  expect(refusal("one\ntwo\n")).toMatch(/at least two columns/);
  expect(refusal("name,plx\n")).toMatch(/no row/);
  expect(refusal("a,a\n1,2\n")).toMatch(/same name/);
  expect(refusal("a,,b\n1,2,3\n")).toMatch(/name every column/);
});
