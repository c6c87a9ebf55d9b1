import { expect, test } from "vitest";
import { officePlaces } from "./office-places.ts";

const labels = (roles: Parameters<typeof officePlaces>[0]) =>
  officePlaces(roles)
    .flat()
    .map((place) => place.label);

test("an administrator sees people and mail, a publisher does not", () => {
  expect(labels(["admin"])).toEqual(expect.arrayContaining(["People", "Mail", "Pattern book"]));
  expect(labels(["publisher"])).not.toContain("People");
  expect(labels(["publisher"])).not.toContain("Mail");
});

test("intake is shown only to those who may bring something in", () => {
  expect(labels(["editor"])).toContain("Intake");
  expect(labels(["publisher"])).not.toContain("Intake");
});

test("nobody without a role sees a place, and no group is left empty", () => {
  expect(officePlaces([])).toEqual([]);
  for (const group of officePlaces(["scientist"])) expect(group.length).toBeGreaterThan(0);
});
