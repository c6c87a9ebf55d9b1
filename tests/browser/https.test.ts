import { type ChildProcess, spawn } from "node:child_process";
import { readFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { setTimeout as pause } from "node:timers/promises";
import { afterAll, beforeAll, expect, inject, test } from "vitest";
import { ROOT } from "#storage/paths.mjs";
import { freePort } from "#storage/ports.mjs";
import { MARK } from "#storage/processes.mjs";
import { demoAccounts } from "./sign-in-as.ts";

// The same build and data once more, told that people reach it by https through one proxy, which hands requests on by http.

const PUBLIC_URL = "https://alidade.example.org";
let server: ChildProcess;
let base = "";

beforeAll(async () => {
  const port = await freePort();
  base = `http://127.0.0.1:${port}`;
  const folder = dirname(inject("accountsFile"));
  const stack = JSON.parse(readFileSync(join(folder, "environment.json"), "utf8"));
  const { VITEST: _, ...environment } = process.env;
  // Marked as a child of the stack, so that it ends with it whatever happens to the tests.
  const own = {
    [MARK]: folder,
    NODE_ENV: "production",
    PUBLIC_URL,
    TRUSTED_PROXIES: "1",
    HOST: "127.0.0.1",
    PORT: String(port),
  };
  const program = join(ROOT, "node_modules", "@react-router", "serve", "bin.js");
  server = spawn(process.execPath, [program, join(ROOT, "build", "server", "index.js")], {
    cwd: ROOT,
    env: { ...environment, ...stack, ...own },
    stdio: "ignore",
  });
  for (let tries = 0; tries < 200; tries += 1) {
    if (await fetch(`${base}/healthz`).catch(() => null)) return;
    await pause(100);
  }
  throw new Error("The server behind the proxy does not answer.");
});

afterAll(() => void server?.kill("SIGTERM"));

/** As the proxy hands it on: by http, with the Origin of the https page and the client's address added at the end. */
function signIn(origin: string): Promise<Response> {
  const { accounts, password } = demoAccounts();
  return fetch(`${base}/sign-in`, {
    method: "POST",
    headers: { Origin: origin, "X-Forwarded-Proto": "https", "X-Forwarded-For": "192.0.2.1, 203.0.113.9" },
    body: new URLSearchParams({ email: accounts[0]?.email ?? "", password }),
    redirect: "manual",
  });
}

test("behind a proxy that ends TLS people can sign in, with a cookie bound to this host", async () => {
  const answer = await signIn(PUBLIC_URL);
  expect([answer.status, answer.headers.get("location")]).toEqual([302, "/desk"]);
  const cookie = answer.headers.get("set-cookie") ?? "";
  expect(cookie).toMatch(/^__Host-alidade=/);
  for (const flag of ["Secure", "HttpOnly", "SameSite=Lax", "Path=/"]) expect(cookie).toContain(flag);
  expect(cookie).not.toMatch(/Domain=/i);
  expect(answer.headers.get("strict-transport-security")).toContain("max-age=");
  const account = await fetch(`${base}/account`, { headers: { Cookie: cookie.split(";")[0] ?? "" } });
  const html = await account.text();
  // What the client itself claimed stands before what the proxy saw, and is not believed.
  expect(html).toContain("203.0.113.9");
  expect(html).not.toContain("192.0.2.1");
});

test.each([PUBLIC_URL.replace("https", "http"), "https://elsewhere.example", "http://127.0.0.1"])(
  "behind it a form from %s is refused",
  async (origin) => {
    expect((await signIn(origin)).status).toBe(403);
  },
);
