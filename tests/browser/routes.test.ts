import { readdirSync, readFileSync } from "node:fs";
import type { RouteConfigEntry } from "@react-router/dev/routes";
import { beforeAll, expect, inject, test } from "vitest";
import routes from "#app/routes.ts";
import { type Access, ROUTE_ACCESS } from "./route-access.ts";
import { demoAccounts } from "./sign-in-as.ts";

// Every address, by GET and by each form's intent, against nobody and every role, over HTTP as people meet it.

const ROLES = ["editor", "scientist", "publisher", "admin"] as const;
type Who = (typeof ROLES)[number] | "nobody";
const EVERYBODY: Who[] = ["nobody", ...ROLES];

function flatten(entries: RouteConfigEntry[]): { path: string; file: string }[] {
  return entries.flatMap(({ index, path, file, children }) => [
    ...(index || path ? [{ path: path ?? "/", file }] : []),
    ...flatten(children ?? []),
  ]);
}

const map = flatten(await routes);
const paths = map.map(({ path }) => path);
const sourceOf = (file: string) => readFileSync(`app/${file}`, "utf8");
const base = inject("baseUrl");
const cookies = new Map<Who, string>();
const params = new Map<string, string>();

async function signIn(role: string): Promise<string> {
  const { accounts, password } = demoAccounts();
  const email = accounts.find((one) => one.role === role)?.email ?? "";
  const answer = await post("/sign-in", "", { email, password });
  return answer.headers.get("set-cookie")?.split(";")[0] ?? "";
}

function post(path: string, cookie: string, fields: Record<string, string>): Promise<Response> {
  const headers = { Origin: base, Cookie: cookie, "Content-Type": "application/x-www-form-urlencoded" };
  return fetch(base + path, { method: "POST", headers, body: new URLSearchParams(fields), redirect: "manual" });
}

const get = (path: string, cookie: string) =>
  fetch(base + path, { headers: { Cookie: cookie, Accept: "text/html" }, redirect: "manual" });

/** The first address that a page links to under a prefix. */
async function linked(page: string, pattern: RegExp, who: Who = "editor"): Promise<string> {
  const html = await (await get(page, cookies.get(who) ?? "")).text();
  const found = pattern.exec(html)?.[1];
  if (!found) throw new Error(`${page} links to nothing like ${pattern}`);
  return found;
}

beforeAll(async () => {
  for (const role of ROLES) cookies.set(role, await signIn(role));
  cookies.set("nobody", "");
  params.set("record", await linked("/stars", /href="\/stars\/(\w{26})"/));
  params.set("source", await linked("/sources", /href="\/sources\/(\w{26})"/));
  params.set("exhibit", await linked("/exhibits", /href="\/exhibits\/(\w{26})"/));
  const exhibit = `/exhibits/${params.get("exhibit")}`;
  params.set("scene", await linked(exhibit, /scenes\/(\w{26})"/));
  params.set("kiosk", await linked("/kiosks", /href="\/kiosks\/(\w{26})"/));
  params.set("person", await linked("/people", /href="\/people\/(\w{26})"/, "admin"));
});

/** An address with the demo's own ids in it; what the demo has none of becomes an id that nothing has. */
function addressOf(path: string): string {
  const filled = path.replace(/:(\w+)/g, (_, name: string) =>
    path.startsWith("k/")
      ? "entrance"
      : path.startsWith("feed/")
        ? "nearest-suns"
        : (params.get(name) ?? "0".repeat(26)),
  );
  return `/${filled.replace("*", "nothing-here").replace(/^\//, "")}`;
}

const may = (who: Who, access: Access["get"]) =>
  access === "everybody" || (who !== "nobody" && (access === "staff" || access.includes(who)));

const toSignIn = (answer: Response) =>
  answer.status === 302 && (answer.headers.get("location") ?? "").startsWith("/sign-in?to=");

test("every address of the map is in the table, and nothing else", () => {
  expect(Object.keys(ROUTE_ACCESS).sort()).toEqual([...paths].sort());
});

/** Answer by an action whatever is asked of them: that here nothing is kept, or that nothing can be changed. */
const REFUSE_ALL = ["api/distance", "api/*", "*", "pattern-book"];

test("every address that takes forms says in the table who may send them", () => {
  const acting = map.filter(({ file }) => /export (?:const|async function) action\b/.test(sourceOf(file)));
  const told = paths.filter((path) => ROUTE_ACCESS[path]?.post);
  expect([...told, ...REFUSE_ALL].sort()).toEqual(acting.map(({ path }) => path).sort());
});

test("every intent that a page sends or understands is in the table", () => {
  const known = new Set(posts.map(({ intent }) => intent));
  const sources = readdirSync("app/routes", { recursive: true, encoding: "utf8" }).filter(
    (file) => /\.tsx?$/.test(file) && !/\.test\.|pattern-book/.test(file),
  );
  const intents = sources.flatMap((file) => {
    const text = sourceOf(`routes/${file}`);
    const sent = [...text.matchAll(/\bintent="([\w-]+)"|name="intent" value="([\w-]+)"/g)];
    const switched = text.includes('get("intent")') ? [...text.matchAll(/case "([\w-]+)":/g)] : [];
    return [...sent, ...switched].map((match) => ({ file, intent: match[1] ?? match[2] ?? "" }));
  });
  expect(intents.length).toBeGreaterThan(20);
  expect(intents.filter(({ intent }) => !known.has(intent))).toEqual([]);
});

test.each(paths)("GET %s opens to whom it should, and to nobody else", async (path) => {
  const access = ROUTE_ACCESS[path];
  if (!access) throw new Error(`${path} is not in the table`);
  for (const who of EVERYBODY) {
    const answer = await get(addressOf(path), cookies.get(who) ?? "");
    if (may(who, access.get)) {
      expect([who, answer.status === 403, toSignIn(answer), answer.status >= 500]).toEqual([who, false, false, false]);
    } else if (who === "nobody") expect([who, toSignIn(answer)]).toEqual([who, true]);
    else expect([who, answer.status]).toEqual([who, 403]);
    await answer.body?.cancel();
  }
});

const posts = Object.entries(ROUTE_ACCESS).flatMap(([path, { post: intents }]) =>
  Object.entries(intents ?? {}).map(([intent, who]) => ({ path, intent, who })),
);

// Fields that make every form readable and none of them right: past the door, the verb has nothing to do.
const FIELDS: Record<string, string> = Object.fromEntries(
  ["recordId", "sceneId", "exhibitId", "kioskId", "personId", "measurementId", "sourceId", "mediaId", "sessionId"].map(
    (name) => [name, "0".repeat(26)],
  ),
);

test.each(posts)(
  "POST $path ($intent) is refused at the door to whom it should be",
  async ({ path, intent, who: access }) => {
    for (const who of EVERYBODY) {
      // Signing out for real would end the session that the other tests use; it has a test of its own.
      if (path === "sign-out" && who !== "nobody") continue;
      const cookie = cookies.get(who) ?? "";
      const more = {
        version: "1",
        digest: "0".repeat(64),
        note: "-",
        reason: "-",
        number: "1",
        by: "1",
        order: "-",
        roles: "editor",
      };
      const answer = await post(addressOf(path), cookie, {
        ...FIELDS,
        ...more,
        ...valid(path, intent),
        ...(intent ? { intent } : {}),
      });
      if (may(who, access)) {
        expect([who, answer.status === 403, toSignIn(answer), answer.status >= 500]).toEqual([
          who,
          false,
          false,
          false,
        ]);
      } else if (who === "nobody") expect([who, toSignIn(answer)]).toEqual([who, true]);
      else expect([who, answer.status]).toEqual([who, 403]);
      await answer.body?.cancel();
    }
  },
);

/** What else a form needs before its verb is asked. Each is refused later: nothing it names exists. */
function valid(path: string, intent: string): Record<string, string> {
  const title = { titleEn: "T", titleFr: "", slug: "nearest-suns" };
  const kiosk = { name: "K", station: "S", language: "en", idleSeconds: "60", slug: "entrance" };
  const source = { title: "T", authors: "A, B.", year: "2000", doi: "10.1051/0004-6361:20078357" };
  const forms: Record<string, Record<string, string>> = {
    "stars/new": { name: "N", kind: "star", identifiers: "HIP 32349" },
    "stars/:record/edit": { name: "N", kind: "star" },
    "stars/:record measure": { quantity: "parallax", printed: "1 ± 0.1", unit: "mas" },
    "sources/new": source,
    "sources/:source": source,
    "exhibits/new": title,
    "exhibits/:exhibit rename": title,
    "exhibits/:exhibit add-scene": title,
    "exhibits/:exhibit/scenes/:scene save-scene": {
      titleEn: "T",
      "document.mapping": "linear",
      "document.unit": "ly",
      "document.camera.azimuthDeg": "0",
      "document.camera.elevationDeg": "0",
      "document.camera.distance": "1",
      "document.camera.fovDeg": "40",
    },
    "exhibits/:exhibit/scenes/:scene label-cast": { labelled: "yes" },
    "exhibits/:exhibit/scenes/:scene bind": { key: "k", quantity: "distance", unit: "ly", form: "value" },
    "exhibits/:exhibit/scenes/:scene unbind": { key: "k" },
    "kiosks/new": kiosk,
    "kiosks/:kiosk edit": kiosk,
    "people invite": { name: "N", email: demoAccounts().accounts[0]?.email ?? "" },
    "media/:medium": { creator: "C", creditLine: "L", licence: "own-work", altEn: "A" },
    "account password": { current: "-", password: "a long enough sentence", again: "a long enough sentence" },
    theme: { theme: "system", to: "/sign-in" },
    "forgot-password": { email: "nobody@tern-point.example" },
  };
  return forms[intent ? `${path} ${intent}` : path] ?? {};
}

test("pages and resource routes carry the usual headers, and every script the nonce of its answer", async () => {
  for (const path of ["/sign-in", "/k/entrance", "/feed/nearest-suns.json", "/api/distance?parallax=10&error=1"]) {
    const answer = await get(path, "");
    const policy = answer.headers.get("content-security-policy") ?? "";
    const nonce = /script-src 'self' 'nonce-([^']+)'/.exec(policy)?.[1];
    expect(nonce, path).toBeTruthy();
    expect(policy).not.toMatch(/script-src[^;]*unsafe/);
    expect(answer.headers.get("x-content-type-options")).toBe("nosniff");
    expect(answer.headers.get("x-frame-options")).toBe("DENY");
    expect(answer.headers.get("referrer-policy")).toBe("same-origin");
    const html = answer.headers.get("content-type")?.startsWith("text/html") ? await answer.text() : "";
    for (const [tag] of html.matchAll(/<script[^>]*>/g)) expect(tag).toContain(`nonce="${nonce}"`);
    expect(html).not.toMatch(/\son\w+="/);
  }
});

test.each(ROLES)("signing out ends the session of a person who is %s, and of no other", async (role) => {
  const [own, other] = [await signIn(role), cookies.get(role) ?? ""];
  expect((await get("/account", own)).status).toBe(200);
  const answer = await post("/sign-out", own, {});
  expect(answer.headers.get("location")).toBe("/sign-in?said=signed-out");
  expect(answer.headers.get("set-cookie")).toMatch(/^alidade=;.*Max-Age=0/);
  expect(toSignIn(await get("/account", own))).toBe(true);
  expect((await get("/account", other)).status).toBe(200);
});

test("an address that cannot be posted to says which methods it answers", async () => {
  for (const path of ["/healthz", "/readyz", "/feed/nearest-suns.json", "/api/distance", "/k/entrance"]) {
    const answer = await post(path, "", {});
    expect([path, answer.status, answer.headers.get("allow")]).toEqual([path, 405, "GET, HEAD"]);
    await answer.body?.cancel();
  }
  for (const path of ["/sign-out", "/theme"]) {
    const answer = await fetch(base + path, { method: "DELETE", headers: { Origin: base } });
    expect([path, answer.status, answer.headers.get("allow")]).toEqual([path, 405, "POST"]);
    expect(answer.headers.get("content-type")).toBe("application/problem+json");
  }
});

test("too many attempts are told when to come back, whatever address they claim to come from", async () => {
  let answer: Response | undefined;
  for (let attempt = 0; attempt < 11; attempt += 1) {
    const headers = { Origin: base, "X-Forwarded-For": `203.0.113.${attempt}` };
    const body = new URLSearchParams({ email: "ghost@tern-point.example", password: "wrong" });
    answer = await fetch(`${base}/sign-in`, { method: "POST", headers, body, redirect: "manual" });
    await answer.body?.cancel();
  }
  expect(answer?.status).toBe(429);
  expect(Number(answer?.headers.get("retry-after"))).toBeGreaterThan(0);
});

test("a session says from which address it came: the connection's own", async () => {
  const html = await (await get("/account", cookies.get("editor") ?? "")).text();
  expect(html).toContain("127.0.0.1");
});

test("the session's cookie cannot be read by scripts and does not follow from other sites", async () => {
  const { accounts, password } = demoAccounts();
  const answer = await post("/sign-in", "", { email: accounts[0]?.email ?? "", password });
  const cookie = answer.headers.get("set-cookie") ?? "";
  expect(cookie).toMatch(/^alidade=/);
  for (const flag of ["HttpOnly", "SameSite=Lax", "Path=/"]) expect(cookie).toContain(flag);
});

test("an API address that is not there is a problem in JSON", async () => {
  const answer = await get("/api/nothing", "");
  expect([answer.status, answer.headers.get("content-type")]).toEqual([404, "application/problem+json"]);
  expect(await answer.json()).toMatchObject({ status: 404, title: expect.any(String), detail: expect.any(String) });
});
