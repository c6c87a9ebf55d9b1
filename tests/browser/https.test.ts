import { afterAll, beforeAll, expect, test } from "vitest";
import { type SecondServer, startSecondServer } from "./second-server.ts";
import { demoAccounts } from "./sign-in-as.ts";

// The house told that people reach it by https through one proxy, which hands requests on by http.

const PUBLIC_URL = "https://alidade.example.org";
let server: SecondServer;

beforeAll(async () => {
  server = await startSecondServer({ PUBLIC_URL, TRUSTED_PROXIES: "1" });
});
afterAll(() => server?.stop());

/** As the proxy hands it on: by http, with the Origin of the https page and the client's address added at the end. */
function signIn(origin: string): Promise<Response> {
  const { accounts, password } = demoAccounts();
  return fetch(`${server.base}/sign-in`, {
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
  const account = await fetch(`${server.base}/account`, { headers: { Cookie: cookie.split(";")[0] ?? "" } });
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
