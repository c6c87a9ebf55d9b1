import { spawn } from "node:child_process";
import { once } from "node:events";
import { existsSync, mkdtempSync, readFileSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { expect, test } from "vitest";
import { giveLockBack, takeLock } from "./lock.mjs";
import { birthOf } from "./processes.mjs";

const folder = () => mkdtempSync(join(tmpdir(), "alidade-lock-"));
const writeHolder = (at: string, holder: object) => writeFileSync(join(at, "running.json"), JSON.stringify(holder));
const URL = "http://127.0.0.1:4310";

test("the first takes the lock and leaves who it is", () => {
  const at = folder();
  expect(takeLock(at, URL)).toBeNull();
  expect(JSON.parse(readFileSync(join(at, "running.json"), "utf8"))).toMatchObject({ pid: process.pid, url: URL });
});

test("the second is told who holds it and where that answers", async () => {
  const at = folder();
  const other = spawn("sleep", ["30"]);
  const pid = other.pid ?? 0;
  const holder = { pid, birth: birthOf(pid), url: URL, startedAt: "2026-01-01T00:00:00.000Z" };
  writeHolder(at, holder);
  expect(takeLock(at, "http://127.0.0.1:9999")).toEqual(holder);
  other.kill();
  await once(other, "exit");
});

test("the lock of a holder that died is taken over", async () => {
  const at = folder();
  const other = spawn("sleep", ["30"]);
  const pid = other.pid ?? 0;
  writeHolder(at, { pid, birth: birthOf(pid), url: URL, startedAt: "" });
  other.kill("SIGKILL");
  await once(other, "exit");
  expect(takeLock(at, URL)).toBeNull();
});

test("a later process with the dead holder's number is not taken for it", () => {
  const at = folder();
  writeHolder(at, { pid: 1, birth: "another-boot:42", url: URL, startedAt: "" });
  expect(takeLock(at, URL)).toBeNull();
});

test("half a lock, as a full disk leaves it, is taken over", () => {
  const at = folder();
  writeFileSync(join(at, "running.json"), '{"pid":');
  expect(takeLock(at, URL)).toBeNull();
});

test("of many that start at once over a dead holder's lock exactly one wins", async () => {
  const at = folder();
  writeHolder(at, { pid: 1, birth: "another-boot:42", url: URL, startedAt: "" });
  const program = `
    const { takeLock } = await import(${JSON.stringify(join(import.meta.dirname, "lock.mjs"))});
    console.log(takeLock(${JSON.stringify(at)}, "http://x") === null ? "won" : "lost");
    await new Promise((go) => process.stdin.once("data", go).once("end", go));
  `;
  const racers = Array.from({ length: 6 }, () => spawn(process.execPath, ["--input-type=module", "-e", program]));
  const said = await Promise.all(racers.map(async (racer) => String(await once(racer.stdout, "data")).trim()));
  for (const racer of racers) racer.stdin.end("go");
  await Promise.all(racers.map((racer) => (racer.exitCode === null ? once(racer, "exit") : null)));
  expect(said.sort()).toEqual(["lost", "lost", "lost", "lost", "lost", "won"]);
});

test("only its own lock is given back", () => {
  const at = folder();
  writeHolder(at, { pid: 1, birth: "", url: URL, startedAt: "" });
  giveLockBack(at);
  expect(existsSync(join(at, "running.json"))).toBe(true);
  expect(takeLock(at, URL)).toBeNull();
  giveLockBack(at);
  expect(existsSync(join(at, "running.json"))).toBe(false);
});
