import { afterEach, expect, test, vi } from "vitest";
import { connections } from "#app/database/db.server.ts";
import * as store from "#app/media/object-store.server.ts";
import { loader as healthz } from "./healthz.ts";
import { loader as readyz } from "./readyz.ts";

afterEach(() => vi.restoreAllMocks());

async function failures() {
  const response = await readyz();
  const { checks } = (await response.json()) as { checks: { name: string; ok: boolean; detail: string }[] };
  return {
    status: response.status,
    failed: checks.filter(({ ok }) => !ok).map(({ name, detail }) => `${name}: ${detail}`),
  };
}

// The tests' own database saves the time of flushing at every commit, and so must not pass for ready.
const NOT_DURABLE = "database settings: innodb_flush_log_at_trx_commit is 0";

test("ready names what is missing with 503, and only that", async () => {
  expect(await failures()).toEqual({ status: 503, failed: [NOT_DURABLE] });
});

test("ready is 200 once every setting is as promised", async () => {
  const query = vi.spyOn(connections(), "query");
  const real = query.getMockImplementation() ?? Object.getPrototypeOf(connections()).query.bind(connections());
  query.mockImplementation(async (...args: unknown[]) => {
    const answer = await real(...args);
    if (String(args[0]).includes("flushAtCommit")) answer[0][0].flushAtCommit = 1;
    return answer;
  });
  expect(await failures()).toEqual({ status: 200, failed: [] });
});

test("ready says that the bucket cannot be reached", async () => {
  vi.spyOn(store, "probeBucket").mockRejectedValue(new Error("The store for files is not answering."));
  expect((await failures()).failed).toEqual([NOT_DURABLE, "bucket reachable: The store for files is not answering."]);
});

test("alive asks nothing of the database", async () => {
  vi.spyOn(connections(), "getConnection").mockRejectedValue(new Error("away"));
  vi.spyOn(connections(), "query").mockRejectedValue(new Error("away"));
  const response = healthz();
  expect(response.status).toBe(200);
  expect(await response.json()).toEqual({ status: "alive" });
});
