import { expect, inject, test } from "vitest";
import { expectNoSeriousAxe, newPage } from "./browser.ts";
import { ROUTE_ACCESS } from "./route-access.ts";

const paths = Object.keys(ROUTE_ACCESS).map(
  (path) => `/${path.replace(/:\w+/g, "x").replace("*", "nothing").replace(/^\//, "")}`,
);

// What anybody meets before signing in, as `npm start` serves it.

test("the application is alive and ready: writable, set as promised, migrated, with its bucket", async () => {
  const alive = await fetch(`${inject("baseUrl")}/healthz`);
  expect([alive.status, await alive.json()]).toEqual([200, { status: "alive" }]);
  const ready = await fetch(`${inject("baseUrl")}/readyz`);
  expect([ready.status, await ready.json()]).toEqual([
    200,
    {
      status: "ready",
      checks: { writable: { ok: true }, settings: { ok: true }, migrations: { ok: true }, bucket: { ok: true } },
    },
  ]);
});

test.each([
  ["desk", { width: 1280, height: 800 }, "light"],
  ["wide", { width: 1920, height: 1080 }, "dark"],
  ["phone", { width: 390, height: 844 }, "light"],
  ["phone at night", { width: 390, height: 844 }, "dark"],
] as const)("the sign-in page is clean for axe on a %s", async (_name, viewport, colorScheme) => {
  const page = await newPage({ viewport, colorScheme });
  await page.goto("/sign-in");
  await page.getByRole("button", { name: /sign in/i }).waitFor();
  await expectNoSeriousAxe(page);
  const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(overflow).toBeLessThanOrEqual(0);
});

test("the office sends a stranger to the sign-in page", async () => {
  const page = await newPage();
  await page.goto("/stars");
  await page.waitForURL(/\/sign-in/);
  await page.getByRole("button", { name: /sign in/i }).waitFor();
});

test("an address where nothing is kept says so, with 404", async () => {
  const page = await newPage({ expected: [/status of 404/] });
  const answer = await page.goto("/nothing/here");
  expect(answer?.status()).toBe(404);
  await page.getByRole("heading", { level: 1 }).waitFor();
  await expectNoSeriousAxe(page);
});

test.each([
  ["elsewhere", { Origin: "http://elsewhere.example" }],
  ["a sandboxed frame", { Origin: "null" }],
  ["nowhere that it says", {}],
])("an unsafe request from %s is refused at every address, with our headers", async (_name, origin) => {
  for (const path of paths) {
    for (const method of ["POST", "PUT", "PATCH", "DELETE"]) {
      const answer = await fetch(inject("baseUrl") + path, { method, headers: origin, redirect: "manual" });
      expect([method, path, answer.status]).toEqual([method, path, 403]);
      expect(answer.headers.get("x-request-id"), path).toBeTruthy();
      await answer.body?.cancel();
    }
  }
});
