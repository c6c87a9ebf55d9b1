import type { Quantity } from "#app/database/enums.ts";

interface QuantityFacts {
  label: string;
  /** The unit in which it is computed with. */
  canonical: string;
  /** Every unit that is taken -> how many canonical units it is. */
  units: Record<string, number>;
  /** false: sources print it without an error often enough. */
  errorUsual: boolean;
}

/** What can be measured, and in which units it may be written. */
export const QUANTITY_FACTS: Record<Quantity, QuantityFacts> = {
  parallax: { label: "Parallax", canonical: "mas", units: { mas: 1, arcsec: 1000, uas: 1e-3 }, errorUsual: true },
  "proper-motion-ra": {
    label: "Proper motion in RA (times cos Dec)",
    canonical: "mas/yr",
    units: { "mas/yr": 1, "arcsec/yr": 1000 },
    errorUsual: true,
  },
  "proper-motion-dec": {
    label: "Proper motion in Dec",
    canonical: "mas/yr",
    units: { "mas/yr": 1, "arcsec/yr": 1000 },
    errorUsual: true,
  },
  "radial-velocity": {
    label: "Radial velocity",
    canonical: "km/s",
    units: { "km/s": 1, "m/s": 1e-3 },
    errorUsual: true,
  },
  "magnitude-v": { label: "Magnitude V", canonical: "mag", units: { mag: 1, mmag: 1e-3 }, errorUsual: false },
  "colour-bv": { label: "Colour B−V", canonical: "mag", units: { mag: 1, mmag: 1e-3 }, errorUsual: false },
};

/** Spellings that catalogues use for the units above (VOUnits and older). */
const SPELLINGS: Record<string, string> = {
  "mas.yr**-1": "mas/yr",
  "mas.yr-1": "mas/yr",
  "angle[mas]": "mas",
  "angularvelocity[mas/year]": "mas/yr",
  "angularvelocity[mas.year**-1]": "mas/yr",
  milliarcsecond: "mas",
  µas: "uas",
  μas: "uas",
  microarcsec: "uas",
  '"': "arcsec",
  "″": "arcsec",
  "arcsec.yr**-1": "arcsec/yr",
  "km.s**-1": "km/s",
  "km.s-1": "km/s",
  "velocity[km.s**-1]": "km/s",
  "magnitude[mag]": "mag",
};

/**
 * The unit under the name we keep, or null when it is none of the quantity's.
 * @param text as typed or as a file's header gives it
 */
export function knownUnit(quantity: Quantity, text: string): string | null {
  const plain = text.trim();
  const spelled = SPELLINGS[plain.toLowerCase()] ?? plain;
  return Object.hasOwn(QUANTITY_FACTS[quantity].units, spelled) ? spelled : null;
}

/** In canonical units. `unit` is one of the quantity's. */
export function toCanonical(quantity: Quantity, value: string, unit: string): number {
  const factor = QUANTITY_FACTS[quantity].units[unit];
  if (factor === undefined) throw new RangeError(`"${unit}" is no unit of ${quantity}`);
  // Every factor is a power of ten: it moves the decimal point in the text, so that nothing is rounded twice.
  const [digits, exponent = "0"] = value.split(/e/i);
  return Number(`${digits}e${Number(exponent) + Math.round(Math.log10(factor))}`);
}
