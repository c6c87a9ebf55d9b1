import { RouterContextProvider } from "react-router";
import { expect, test, vi } from "vitest";
import { requestIdContext, retryAfterContext } from "./context.server.ts";
import { Forbidden, Invalid, NotFound, TooMany } from "./errors.ts";
import { answered, answeredAction, answeredApi, isOwnOrigin, readForm } from "./http.server.ts";

const SECRET = "SELECT * FROM person: connection lost";

function asked(fields: [string, string][] = []) {
  const context = new RouterContextProvider();
  context.set(requestIdContext, "id-of-this-one");
  const body = new URLSearchParams(fields);
  return { request: new Request("http://here.example/x", { method: "POST", body }), context };
}

const thrownBy = (call: Promise<unknown>) => call.then(() => null).catch((error: unknown) => error);

test("a verb's refusal becomes the status and the words of the table", async () => {
  const page = answered(() => {
    throw new NotFound("There is no such record.");
  });
  expect(await thrownBy(page(asked()))).toMatchObject({
    data: { kind: "not-found", detail: "There is no such record.", next: expect.any(String) },
    init: { status: 404 },
  });
});

test("what nobody foresaw is told by the request's id alone, on pages, by forms and in the API", async () => {
  const log = vi.spyOn(console, "error").mockImplementation(() => {});
  const breaks = async () => {
    throw new Error(SECRET);
  };
  for (const wrapped of [answered(breaks), answeredAction(breaks)]) {
    const thrown = await thrownBy(wrapped(asked()));
    expect(thrown).toMatchObject({ data: { kind: "broken", requestId: "id-of-this-one" }, init: { status: 500 } });
    expect(JSON.stringify(thrown)).not.toContain("SELECT");
  }
  const answer = await answeredApi(breaks)(asked());
  const text = await answer.text();
  expect([answer.status, answer.headers.get("Content-Type")]).toEqual([500, "application/problem+json"]);
  expect(text).toContain("id-of-this-one");
  expect(text).not.toContain("SELECT");
  expect(log).toHaveBeenCalledTimes(3);
  for (const [line, error] of log.mock.calls) {
    expect(line).toContain("id-of-this-one");
    expect((error as Error).message).toBe(SECRET);
  }
});

test("a service that cannot be reached is 503, and the log keeps to itself what a query was given", async () => {
  const log = vi.spyOn(console, "error").mockImplementation(() => {});
  const refused = Object.assign(new Error("connect"), { code: "ECONNREFUSED", syscall: "connect" });
  const failed = Object.assign(new Error("Failed query: ... params: the-token", { cause: refused }), {
    query: "insert into `outbox` values (?)",
    params: ["the-token"],
  });
  const answer = await answeredApi(() => {
    throw failed;
  })(asked());
  expect(answer.status).toBe(503);
  const logged = log.mock.calls.flat();
  expect(logged[0]).toContain("insert into `outbox`");
  expect(logged.map(String).join()).not.toContain("the-token");
  expect(logged[1]).toBe(refused);
});

test("redirects and answers thrown on purpose pass", async () => {
  const away = new Response(null, { status: 302 });
  expect(
    await thrownBy(
      answered(() => {
        throw away;
      })(asked()),
    ),
  ).toBe(away);
});

test("a refused form comes back with what was typed, every ticked box, and no secret", async () => {
  const args = asked([
    ["email", "ines@tern.example"],
    ["roles", "editor"],
    ["roles", "admin"],
    ["current", "present secret"],
    ["password", "new secret"],
    ["again", "new secret"],
    ["token", "secret"],
  ]);
  const act = answeredAction(async ({ request }: { request: Request }) => {
    await readForm(request);
    throw new Invalid({ password: ["Too short."] });
  });
  const { data, init } = (await act(args)) as unknown as { data: { problem: object }; init: { status: number } };
  expect(init.status).toBe(400);
  expect(data.problem).toMatchObject({
    errors: { password: ["Too short."] },
    values: { email: "ines@tern.example", roles: "editor\nadmin" },
  });
  expect(JSON.stringify(data)).not.toContain("secret");
});

test("too many attempts say when to come back; what a person cannot mend goes to the error page", async () => {
  const args = asked();
  const busy = answeredAction(async (_: typeof args) => {
    throw new TooMany("Too many.", 12.3);
  });
  expect(await busy(args)).toMatchObject({ init: { status: 429 } });
  expect(args.context.get(retryAfterContext)).toBe(13);
  const refused = answeredAction(async (_: typeof args) => {
    throw new Forbidden("No.");
  });
  expect(await thrownBy(refused(asked()))).toMatchObject({ data: { kind: "forbidden" }, init: { status: 403 } });
});

test("only our own pages may change things", () => {
  expect(isOwnOrigin("https://alidade.example.org", "https://alidade.example.org")).toBe(true);
  for (const foreign of [
    null,
    "",
    "null",
    "http://alidade.example.org",
    "https://alidade.example.org.evil.example",
    "https://alidade.example.org:8443",
    "https://evil.example",
  ]) {
    expect(isOwnOrigin(foreign, "https://alidade.example.org"), String(foreign)).toBe(false);
  }
  expect(isOwnOrigin("http://localhost:4310", "http://127.0.0.1:4310")).toBe(true);
  expect(isOwnOrigin("http://localhost:9999", "http://127.0.0.1:4310")).toBe(false);
});
