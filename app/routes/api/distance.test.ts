import fc from "fast-check";
import { expect, test } from "vitest";
import type { DistanceReply } from "#app/catalogue/answer-distance.ts";
import { action, loader } from "./distance.ts";

const get = (query: string | Record<string, string>) =>
  loader({ request: new Request(`http://localhost/api/distance?${new URLSearchParams(query)}`) });

async function answer(query: string | Record<string, string>): Promise<DistanceReply> {
  const response = await get(query);
  const body = await response.json();
  expect(response.status, JSON.stringify(body)).toBe(200);
  expect(response.headers.get("Content-Type")).toContain("application/json");
  return body;
}

async function refused(query: string | Record<string, string>): Promise<Record<string, string>> {
  const response = await get(query);
  expect(response.status).toBe(400);
  expect(response.headers.get("Content-Type")).toBe("application/problem+json");
  const body = await response.json();
  expect(body).toMatchObject({ status: 400, title: expect.any(String), type: expect.any(String) });
  expect(body.detail).toBe(body.errors[0].message);
  return Object.fromEntries(
    body.errors.map(({ parameter, message }: { parameter: string; message: string }) => [parameter, message]),
  );
}

const spaced = (text?: string) => text?.replaceAll("\u00a0", " ").replaceAll("\u202f", " ");

// METHODS.md, "Ranges for visitors", from inverting p +- s: 10 +- 1 mas is 296.5-362.4 ly; 5.95 +- 0.85 mas 479.6-639.5 ly.
test("a firm parallax without a prior answers with 1/p in three units, at full precision", async () => {
  const firm = await answer("parallax=10&error=1");
  expect(firm).toMatchObject({ parallaxMas: 10, errorMas: 1, fractionalError: 0.1, regime: "firm", method: "inverse" });
  expect(firm.pc).toMatchObject({ value: 100, low: 1000 / 11, high: 1000 / 9, mode: 100 });
  expect(firm.ly?.low).toBeCloseTo(296.505797924, 8);
  expect(firm.ly?.high).toBeCloseTo(362.395975241, 8);
  // 1 pc = 648000/pi au (IAU 2015 Resolution B2).
  expect(firm.au?.value).toBeCloseTo((100 * 648000) / Math.PI, 6);
  expect(firm).toMatchObject({ modes: [100], prior: null, reason: null, warning: null });
  expect(spaced(firm.text?.en)).toBe("326 light-years (between 297 and 362)");
  expect(spaced(firm.text?.fr)).toBe("326 années-lumière (entre 297 et 362)");
});

test("a wide parallax is put in words as a range only", async () => {
  const wide = await answer("parallax=5.95&error=0.85&prior=none");
  expect(wide.regime).toBe("wide");
  expect(spaced(wide.text?.en)).toBe("between 480 and 640 light-years");
});

test.each(["parallax=1&error=1", "parallax=-0.4&error=0.9&prior=", "parallax=0&error=1&prior=none&length="])(
  "without a prior a prior-led parallax has no distance, and the reason: %s",
  async (query) => {
    const led = await answer(query);
    expect(led).toMatchObject({ regime: "prior-led", method: null, pc: null, ly: null, au: null, text: null });
    expect(led.modes).toEqual([]);
    expect(led.reason).toContain("prior");
  },
);

test("an infinite fractional error is null: JSON has no infinity", async () => {
  expect((await answer("parallax=0&error=1")).fractionalError).toBeNull();
  expect((await answer("parallax=-0.4&error=0.9")).fractionalError).toBeCloseTo(-2.25, 12);
});

// METHODS.md, "EDSD check values": scipy 1.10.1, printed to eight digits or so, hence 1e-6 relative.
test.each([
  ["parallax=5&error=1&prior=edsd", true, [217.37981, 171.89416, 196.04276, 252.28289, 369.03288, 589.90699]],
  [
    "parallax=0.5&error=1&prior=edsd&length=500",
    false,
    [1157.29811, 662.02157, 907.81399, 1503.6732, 2434.943, 3249.3889],
  ],
] as const)(
  "an EDSD posterior agrees with scipy and names its length: %s",
  async (query, lengthIsDefault, expected) => {
    const { pc, prior, method } = await answer(query);
    expect(method).toBe("edsd");
    expect(prior).toEqual({ name: "edsd", lengthPc: lengthIsDefault ? 1350 : 500, lengthIsDefault });
    const found = [pc?.mode, pc?.low90, pc?.low, pc?.value, pc?.high, pc?.high90];
    found.forEach((number, i) => {
      expect(Math.abs((number ?? 0) / expected[i]! - 1)).toBeLessThan(1e-6);
    });
  },
);

// METHODS.md, "Ranges for visitors": the EDSD posterior of 10 +- 1 mas with L = 1350 pc says 307.6-380.6 ly.
test("with a prior a firm parallax has the posterior's range, not that of 1/p", async () => {
  const { ly } = await answer("parallax=10&error=1&prior=edsd&length=1350");
  expect(ly?.low).toBeCloseTo(307.6, 1);
  expect(ly?.high).toBeCloseTo(380.6, 1);
});

test("what came from a prior says that it depends on the assumption, in every regime", async () => {
  expect((await answer("parallax=1&error=1&prior=edsd")).text?.en).toContain("(depends on the assumption)");
  expect((await answer("parallax=10&error=1&prior=edsd")).text?.fr).toContain("(dépend de l’hypothèse)");
});

test("a posterior with two peaks says so", async () => {
  const two = await answer("parallax=5&error=1&prior=uniform-density&limit=10000");
  expect(two.modes).toHaveLength(2);
  expect(two.modes[1]).toBe(10_000);
  expect(two.warning).toContain("two peaks");
  expect(spaced(two.warning ?? "")).toContain("10,000 pc (");
  expect((await answer("parallax=5&error=1&prior=edsd")).warning).toBeNull();
});

test("a range too narrow for its digits has numbers, no text, and says why", async () => {
  const narrow = await answer("parallax=10&error=1e-20");
  expect(narrow.pc?.value).toBe(100);
  expect(narrow.text).toBeNull();
  expect(narrow.warning).toContain("narrower");
});

test.each([
  ["", { parallax: "missing", error: "missing" }],
  ["parallax=&error=+", { parallax: "missing", error: "missing" }],
  ["parallax=abc&error=1", { parallax: "not a number" }],
  ["parallax=0x10&error=Infinity", { parallax: "not a number", error: "not a number" }],
  ["parallax=NaN&error=1e999", { parallax: "not a number", error: "not a number" }],
  ["parallax=1,5&error=1", { parallax: "1.5" }],
  ["parallax=1e31&error=1", { parallax: "1e30" }],
  ["parallax=1&error=0", { error: "above zero" }],
  ["parallax=1&error=-0.1", { error: "above zero" }],
  ["parallax=1&error=1e-400", { error: "above zero" }],
  ["parallax=1&error=1&prior=gaussian", { prior: "edsd, uniform-density, uniform-distance or none" }],
  ["parallax=1&error=1&prior=edsd&length=0", { length: "above zero" }],
  ["parallax=1&error=1&prior=edsd&length=x", { length: "not a number" }],
  ["parallax=1&error=1&length=-5", { length: "above zero" }],
  ["parallax=1&error=1&prior=uniform-density", { limit: "missing" }],
  ["parallax=1&error=1&prior=uniform-distance&limit=", { limit: "missing" }],
  ["parallax=1&error=1&prior=uniform-distance&limit=-1", { limit: "above zero" }],
  ["parallax=1&parallax=2&error=1", { parallax: "more than once" }],
  ["parallax=1&error=1&prior=edsd&prior=edsd", { prior: "more than once" }],
  ["parallax=1&error=1&eror=2", { eror: "No such parameter" }],
  ["parallax=1&error=1&constructor=1", { constructor: "No such parameter" }],
  ["parallax=1&error=1&x=1&x=2", { x: "No such parameter" }],
  ["parallax=x&error=-1&prior=y&length=0&z=1", { parallax: "x", error: "", prior: "y", length: "", z: "No such" }],
  ["parallax=x&error=1&prior=uniform-density", { parallax: "not a number", limit: "missing" }],
  [`parallax=${"1".repeat(10_000)}&error=1`, { parallax: "64" }],
] as [string, Record<string, string>][])(
  "a bad question is refused by the name of each parameter: %s",
  async (query, expected) => {
    const errors = await refused(query);
    expect(Object.keys(errors).sort()).toEqual(Object.keys(expected).sort());
    for (const [parameter, part] of Object.entries(expected)) expect(errors[parameter]).toContain(part);
  },
);

test("signs, a typographic minus, exponents and blanks around a number are read", async () => {
  expect((await answer({ parallax: " +1.0e1 ", error: "1" })).parallaxMas).toBe(10);
  expect((await answer({ parallax: "\u22120.4", error: ".9" })).parallaxMas).toBe(-0.4);
});

test("only GET is answered", () => {
  const response = action();
  expect(response.status).toBe(405);
  expect(response.headers.get("Allow")).toBe("GET, HEAD");
});

test("whatever is accepted is answered: finite, in order, the same in every unit", async () => {
  const positive = fc.tuple(fc.double({ min: 1, max: 9.99, noNaN: true }), fc.integer({ min: -12, max: 12 }));
  const text = ([mantissa, power]: [number, number]) => String(mantissa * 10 ** power);
  const priors = fc.constantFrom("none", "edsd", "uniform-density", "uniform-distance");
  await fc.assert(
    fc.asyncProperty(positive, fc.boolean(), positive, positive, priors, async (p, negative, s, scale, prior) => {
      const parallax = (negative ? "-" : "") + text(p);
      const { pc, ly, method, reason } = await answer({
        parallax,
        error: text(s),
        prior,
        length: text(scale),
        limit: text(scale),
      });
      expect(pc === null).toBe(method === null);
      expect(reason === null).toBe(pc !== null);
      if (!pc || !ly) return;
      const ascending = [pc.low90, pc.low, pc.value, pc.high, pc.high90];
      expect(ascending.every((number) => Number.isFinite(number) && number > 0)).toBe(true);
      expect(ascending).toEqual([...ascending].sort((a, b) => a - b));
      // 1 pc = 3.261563777167433 ly (METHODS.md, Units); 1e-14: two roundings of doubles.
      expect(Math.abs(ly.value / pc.value / 3.261563777167433 - 1)).toBeLessThan(1e-14);
    }),
    { numRuns: 300 },
  );
});
