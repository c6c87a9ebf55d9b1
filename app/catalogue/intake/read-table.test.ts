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

test("10 MB of rubbish is refused, whatever it is made of", () => {
  const random = new Uint8Array(10_485_760);
  for (let at = 0; at < random.length; at += 1) random[at] = (at * 2_654_435_761) >>> 13;
  for (const bytes of [
    random,
    new TextEncoder().encode("lorem ".repeat(1_700_000)),
    new TextEncoder().encode("a,b\n".repeat(1)),
    new TextEncoder().encode(",".repeat(10_000_000)),
    new TextEncoder().encode(`name,x\n"${"never closed ".repeat(800_000)}`),
  ]) {
    expect(refusal(bytes)).not.toBe("accepted");
  }
});

test("a file without a head, without rows, or with two columns of one name is refused", () => {
  expect(refusal("")).toMatch(/at least two columns/);
  expect(refusal("name,plx\n")).toMatch(/no row/);
  expect(refusal("a,a\n1,2\n")).toMatch(/same name/);
  expect(refusal("a,,b\n1,2,3\n")).toMatch(/name every column/);
});
