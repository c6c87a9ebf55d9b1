import type { AdoptedParallax } from "./distance-of.ts";

/** What the gate looks at; read by the page and by the verb alike. */
export interface GateFacts {
  name: string;
  raDeg: number | null;
  positionEpoch: string | null;
  positionSourceId: string | null;
  positionLocator: string | null;
  adopted: (AdoptedParallax & Cited & { fromMemory: boolean }) | null;
  adoptedReason: string | null;
  regime: "firm" | "wide" | "prior-led" | null;
  prior: string | null;
  priorReason: string | null;
}

interface Cited {
  sourceId: string | null;
  locator: string | null;
  epoch: string | null;
}

export interface Missing {
  field: string;
  message: string;
}

/** Everything that stands between a record and being vetted, all at once. Empty: it may be vetted. */
export function missingForVetting(facts: GateFacts): Missing[] {
  const rules: [field: string, missing: boolean, message: string][] = [
    ["name", facts.name.trim() === "", "A name is missing."],
    ["position", facts.raDeg === null, "The position is missing."],
    ["positionEpoch", facts.positionEpoch === null, "The epoch of the position is missing."],
    ["positionSource", facts.positionSourceId === null, "The source of the position is missing."],
    ["positionLocator", facts.positionLocator === null, "Where in its source the position stands is missing."],
    ["adopted", facts.adopted === null, "No parallax is adopted."],
    ["adoptedReason", facts.adopted !== null && !facts.adoptedReason, "Why this parallax is adopted is missing."],
  ];
  if (facts.adopted) {
    rules.push(
      ["adoptedError", facts.adopted.error === null, "The adopted parallax has no error."],
      ["adoptedSource", facts.adopted.sourceId === null, "The source of the adopted parallax is missing."],
      ["adoptedLocator", facts.adopted.locator === null, "Where in its source the adopted parallax stands is missing."],
      ["adoptedEpoch", facts.adopted.epoch === null, "The epoch of the adopted parallax is missing."],
      [
        "adoptedMemory",
        facts.adopted.fromMemory,
        "The adopted parallax is from memory: compare it with its source first.",
      ],
    );
  }
  if (facts.regime === "prior-led") {
    rules.push(["prior", facts.prior === null, "The parallax is prior-led: choose a named prior with a reason."]);
  }
  rules.push(["priorReason", facts.prior !== null && !facts.priorReason, "Why this prior is missing."]);
  return rules.filter(([, missing]) => missing).map(([field, , message]) => ({ field, message }));
}
