import { QUANTITIES, type Quantity } from "#app/database/enums.ts";
import { knownUnit, QUANTITY_FACTS } from "../quantities.ts";
import type { TableColumn } from "./table.ts";

/** What a column can mean. */
export const MEANINGS = [
  "ignore",
  "name",
  "identifier",
  "ra",
  "dec",
  ...QUANTITIES,
  ...QUANTITIES.map((quantity) => `${quantity}-error` as const),
] as const;
export type Meaning = (typeof MEANINGS)[number];

export interface ColumnUse {
  meaning: Meaning;
  /** Of a quantity or its error, by the name we keep. */
  unit: string | null;
  /** Of an identifier: what stands before the number, such as "HIP". */
  catalogue: string | null;
}

export const IGNORED: ColumnUse = { meaning: "ignore", unit: null, catalogue: null };

export function quantityOf(meaning: Meaning): Quantity | null {
  const plain = meaning.replace(/-error$/, "");
  return QUANTITIES.find((one) => one === plain) ?? null;
}

/** In which positions are read: degrees, or parts that say themselves what they are. */
const POSITION_UNIT = /^(deg(ree)?s?|angle\[deg\]|[hd]:m:s)$/i;
export const isPositionUnit = (unit: string | null) => unit === null || POSITION_UNIT.test(unit.trim());

const NAMES: [pattern: RegExp, meaning: Meaning, catalogue?: string][] = [
  [/^(name|main_id|star|object)$/i, "name"],
  [/^hip$/i, "identifier", "HIP"],
  [/^hd$/i, "identifier", "HD"],
  [/^hr$/i, "identifier", "HR"],
  [/^(gj|gliese)$/i, "identifier", "GJ"],
  [/^(source_id|gaia_source_id|gaiadr3|dr3name|source)$/i, "identifier", "Gaia DR3"],
  [/^(_?ra(_?icrs|_?j2000|deg)?|raj2000)$/i, "ra"],
  [/^(_?de(c)?(_?icrs|_?j2000|deg)?|dej2000)$/i, "dec"],
  [/^(e_plx|e_parallax|parallax_err(or)?(_mas)?|plx_err(or)?|sigma_parallax)$/i, "parallax-error"],
  [/^(plx|parallax|par|parallax_mas)$/i, "parallax"],
  [/^(e_pmra|pmra_error)$/i, "proper-motion-ra-error"],
  [/^(pmra|pm_ra|pmra_cosdec)$/i, "proper-motion-ra"],
  [/^(e_pmde(c)?|pmdec_error)$/i, "proper-motion-dec-error"],
  [/^(pmde|pmdec|pm_dec)$/i, "proper-motion-dec"],
  [/^(e_rv|radial_velocity_error|rv_error)$/i, "radial-velocity-error"],
  [/^(rv|radial_velocity|rvel)$/i, "radial-velocity"],
  [/^(e_vmag|v_mag_error)$/i, "magnitude-v-error"],
  [/^(vmag|v_mag|v)$/i, "magnitude-v"],
  [/^(e_b-v|bv_error)$/i, "colour-bv-error"],
  [/^(b-v|b_v|bv|b_minus_v)$/i, "colour-bv"],
];

/** UCD1+ words of the IVOA that name what we keep. */
const UCDS: [ucd: RegExp, meaning: Meaning][] = [
  [/^stat\.error;pos\.parallax/i, "parallax-error"],
  [/^(pos\.parallax|pos_parlx)/i, "parallax"],
  [/^pos\.eq\.ra(;meta\.main)?$|^pos_eq_ra_main$/i, "ra"],
  [/^pos\.eq\.dec(;meta\.main)?$|^pos_eq_dec_main$/i, "dec"],
  [/^stat\.error;pos\.pm;pos\.eq\.ra/i, "proper-motion-ra-error"],
  [/^pos\.pm;pos\.eq\.ra|^pos_eq_pmra$/i, "proper-motion-ra"],
  [/^stat\.error;pos\.pm;pos\.eq\.dec/i, "proper-motion-dec-error"],
  [/^pos\.pm;pos\.eq\.dec|^pos_eq_pmdec$/i, "proper-motion-dec"],
  [/^stat\.error;spect\.dopplerveloc/i, "radial-velocity-error"],
  [/^spect\.dopplerveloc/i, "radial-velocity"],
  [/^stat\.error;phot\.mag;em\.opt\.v/i, "magnitude-v-error"],
  [/^phot\.mag;em\.opt\.v/i, "magnitude-v"],
  [/^phot\.color;em\.opt\.b;em\.opt\.v/i, "colour-bv"],
];

/**
 * What a column most likely means, by its name, then by its UCD. Where the file gives a unit that is none of the quantity's,
 * none is guessed: a person has to say.
 */
export function recognise(column: TableColumn): ColumnUse {
  const named = NAMES.find(([pattern]) => pattern.test(column.name.trim()));
  const meaning = named?.[1] ?? UCDS.find(([ucd]) => ucd.test(column.ucd ?? ""))?.[1] ?? "ignore";
  const quantity = quantityOf(meaning);
  const unit = quantity ? knownUnit(quantity, column.unit ?? QUANTITY_FACTS[quantity].canonical) : null;
  return { meaning, unit, catalogue: named?.[2] ?? null };
}

/** The first column of a meaning keeps it; a second one that was recognised alike is left for a person to place. */
export function recogniseAll(columns: TableColumn[]): ColumnUse[] {
  const taken = new Set<string>();
  return columns.map((column) => {
    const use = recognise(column);
    const key = use.meaning === "identifier" ? `identifier ${use.catalogue}` : use.meaning;
    if (use.meaning === "ignore" || taken.has(key)) return IGNORED;
    taken.add(key);
    return use;
  });
}
