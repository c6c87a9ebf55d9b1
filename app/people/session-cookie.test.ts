import { expect, test } from "vitest";
import { sessionCookie } from "./session-cookie.server.ts";

const flagsOf = async (publicUrl: string) => (await sessionCookie(publicUrl).serialize("token")).split("; ");

test("on https the cookie is bound to this host: __Host-, Secure, the whole path and no domain", async () => {
  const [pair, ...flags] = await flagsOf("https://alidade.example.org");
  expect(pair).toMatch(/^__Host-alidade=/);
  expect(flags.sort()).toEqual(["HttpOnly", "Path=/", "SameSite=Lax", "Secure"]);
});

test("on http, where browsers refuse the prefix, it keeps the other flags", async () => {
  const [pair, ...flags] = await flagsOf("http://127.0.0.1:4310");
  expect(pair).toMatch(/^alidade=/);
  expect(flags.sort()).toEqual(["HttpOnly", "Path=/", "SameSite=Lax"]);
});
