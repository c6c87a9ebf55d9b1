import { expect, test } from "vitest";
import { canonicalBytes } from "./canonical.ts";

const text = (value: unknown) => new TextDecoder().decode(canonicalBytes(value));

// RFC 8785, section 3.2.2 and 3.2.3: the worked example of serialisation and property sorting.
test("the worked example of RFC 8785 section 3.2.2 is serialised as printed there", () => {
  const input = JSON.parse(
    '{"numbers":[333333333.33333329,1E30,4.50,2e-3,0.000000000000000000000000001],"string":"\\u20ac$\\u000F\\u000aA\'\\u0042\\u0022\\u005c\\\\\\"\\/","literals":[null,true,false]}',
  );
  expect(text(input)).toBe(
    '{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],"string":"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}',
  );
});

test("keys are sorted by UTF-16 code units as in RFC 8785 section 3.2.3", () => {
  const input = {
    "\u20ac": "Euro Sign",
    "\r": "Carriage Return",
    "\ufb33": "Hebrew Letter Dalet With Dagesh",
    "1": "One",
    "\ud83d\ude00": "Emoji: Grinning Face",
    "\u0080": "Control",
    "\u00f6": "Latin Small Letter O With Diaeresis",
  };
  const written = text(input);
  const names = ["Carriage", "One", "Control", "Latin", "Euro", "Emoji", "Hebrew"];
  const places = names.map((name) => written.indexOf(`"${name}`));
  expect(places).not.toContain(-1);
  expect(places).toEqual([...places].sort((a, b) => a - b));
});

test("numbers are written as in RFC 8785 appendix B", () => {
  const bits = (hex: string) => {
    const view = new DataView(new ArrayBuffer(8));
    view.setBigUint64(0, BigInt(`0x${hex}`));
    return view.getFloat64(0);
  };
  // Rows of the table in appendix B.
  const rows: [string, string][] = [
    ["0000000000000000", "0"],
    ["8000000000000000", "0"],
    ["0000000000000001", "5e-324"],
    ["8000000000000001", "-5e-324"],
    ["7fefffffffffffff", "1.7976931348623157e+308"],
    ["4340000000000000", "9007199254740992"],
    ["4430000000000000", "295147905179352830000"],
    ["44b52d02c7e14af5", "9.999999999999997e+22"],
    ["44b52d02c7e14af6", "1e+23"],
    ["44b52d02c7e14af7", "1.0000000000000001e+23"],
    ["444b1ae4d6e2ef4e", "999999999999999700000"],
    ["444b1ae4d6e2ef50", "1e+21"],
    ["3eb0c6f7a0b5ed8c", "9.999999999999997e-7"],
    ["3eb0c6f7a0b5ed8d", "0.000001"],
    ["41b3de4355555553", "333333333.3333332"],
    ["41b3de4355555557", "333333333.33333343"],
    ["becbf647612f3696", "-0.0000033333333333333333"],
    ["43143ff3c1cb0959", "1424953923781206.2"],
  ];
  for (const [hex, shown] of rows) expect(text(bits(hex)), hex).toBe(shown);
});

test("what JSON cannot say is refused", () => {
  for (const value of [Number.NaN, Number.POSITIVE_INFINITY, undefined]) {
    expect(() => canonicalBytes(value)).toThrow();
  }
});
