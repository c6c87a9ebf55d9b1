import { expect, test } from "vitest";
import { distanceFromParallax } from "#app/astrometry/distance.ts";
import { invertParallax, type Regime, regimeOf } from "#app/astrometry/parallax.ts";
import { checkAll, expectClose } from "./check.ts";
import { readTable } from "./table.ts";

interface Case {
  parallaxMas: number;
  errorMas: number;
  regime: Regime;
  /** At p, p + s, p - s, p + 1.645 s, p - 1.645 s. */
  pc: number[] | null;
  ly: number[] | null;
  au: number[] | null;
}

// 1/(p - s) repeats the rounding of p - s times p/(p - s): 1e-12 holds unless p - s is a thousandth of p or less.
const TOLERANCE = 1e-12;

test("regimes agree with exact fractions, on the limits too", () => {
  const { cases } = readTable<Case>("parallax");
  checkAll(cases, (one) => {
    expect(regimeOf(one.parallaxMas, one.errorMas)).toBe(one.regime);
  });
  for (const regime of ["firm", "wide", "prior-led"]) {
    expect(cases.filter((one) => one.regime === regime).length).toBeGreaterThan(40);
  }
});

test("inverse distances and their ranges agree with astropy's parallax equivalency", () => {
  const positive = readTable<Case>("parallax").cases.filter((one) => one.parallaxMas > 0);
  checkAll(positive, (one) => {
    const found = invertParallax(one.parallaxMas, one.errorMas);
    const ends = [found.valuePc, found.lowPc, found.highPc, found.low90Pc, found.high90Pc];
    ends.forEach((end, i) => {
      const nearness = one.pc![i]! / found.valuePc;
      expectClose(end, one.pc![i]!, TOLERANCE * Math.max(1, nearness / 1000));
    });
  });
});

test("answers without a prior agree with astropy in pc, ly and au, and are held back where they must be", () => {
  checkAll(readTable<Case>("parallax").cases, (one) => {
    const answer = distanceFromParallax(one);
    expect(answer.regime).toBe(one.regime);
    for (const unit of ["pc", "ly", "au"] as const) {
      if (one.regime === "prior-led") {
        expect(answer[unit]).toBeNull();
        continue;
      }
      const { value, low, high, low90, high90, mode } = answer[unit]!;
      expect(mode).toBe(value);
      [value, low, high, low90, high90].forEach((found, i) => {
        expectClose(found, one[unit]![i]!, TOLERANCE);
      });
    }
  });
});
