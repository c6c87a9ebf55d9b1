import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { FACES } from "./faces.ts";

test("the browser fetches the faces that the server reads, in the same order", () => {
  const source = readFileSync(new URL("./use-fonts.ts", import.meta.url), "utf8");
  const imported = new Map(
    [...source.matchAll(/import (\w+) from "(.+?)\?url/g)].map(([, name, file]) => [name, file]),
  );
  const listed = (list: string) =>
    new RegExp(`const ${list} = \\[(.+?)\\]`)
      .exec(source)?.[1]
      ?.split(", ")
      .map((name) => imported.get(name));
  expect(listed("HEAD")).toEqual([...FACES.head]);
  expect(listed("BODY")).toEqual([...FACES.body]);
});
