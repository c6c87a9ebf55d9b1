import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, test } from "vitest";
import { packagesAreCurrent } from "./packages.mjs";

const WANTED = {
  "": { version: "1.0.0" },
  "node_modules/a": { version: "1.2.3" },
  "node_modules/win": { version: "1.0.0", optional: true },
};

function checkout(installed: object | null) {
  const root = mkdtempSync(join(tmpdir(), "alidade-packages-"));
  writeFileSync(join(root, "package-lock.json"), JSON.stringify({ packages: WANTED }));
  if (installed) {
    mkdirSync(join(root, "node_modules", "a"), { recursive: true });
    writeFileSync(join(root, "node_modules", ".package-lock.json"), JSON.stringify({ packages: installed }));
  }
  return root;
}

test("a fresh clone, and an install that was interrupted, are not current", () => {
  expect(packagesAreCurrent(checkout(null))).toBe(false);
});

test("what the lock asks for is there; packages for other machines may be missing", () => {
  expect(packagesAreCurrent(checkout({ "node_modules/a": { version: "1.2.3" } }))).toBe(true);
});

test("another version than the lock's is not current", () => {
  expect(packagesAreCurrent(checkout({ "node_modules/a": { version: "1.2.2" } }))).toBe(false);
});

test("a package that was deleted by hand is not current", () => {
  const root = checkout({ "node_modules/a": { version: "1.2.3" } });
  rmSync(join(root, "node_modules", "a"), { recursive: true });
  expect(packagesAreCurrent(root)).toBe(false);
});
