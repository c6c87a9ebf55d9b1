import { randomBytes } from "node:crypto";
import { data, type MiddlewareFunction, type RouterContextProvider } from "react-router";
import { nonceContext, requestIdContext, retryAfterContext } from "./context.server.ts";
import { isConnectionError } from "./database/database-error.ts";
import { env } from "./env.server.ts";
import {
  AppError,
  answerFor,
  answerForStatus,
  type ErrorKind,
  type ErrorLink,
  type FieldErrors,
  Invalid,
  TooMany,
} from "./errors.ts";

/** What a refused form gets back: messages by field, and what was typed, so that nothing is lost. */
export interface FormProblem {
  problem: {
    kind: ErrorKind;
    message: string;
    errors: FieldErrors;
    values: Record<string, string>;
    links?: readonly ErrorLink[];
  };
}

/** What an error page is given instead of the error itself. */
export interface PageProblem {
  kind: ErrorKind | "broken";
  title: string;
  detail: string | null;
  next: string;
  /** By which the log knows what broke. */
  requestId?: string;
}

/** What every loader and action is given; in unit tests a request may come without a context. */
interface Asked {
  request?: Request;
  context?: Readonly<RouterContextProvider>;
}

const SAFE_METHODS = new Set(["GET", "HEAD", "OPTIONS"]);
const forms = new WeakMap<Request, FormData>();

/** Keeps what was typed, for a form that is read in another way (upload.server.ts). */
export function rememberForm(request: Request, form: FormData): void {
  forms.set(request, form);
}

/** Reads a form once; what it held can still be shown again if the verb refuses it. */
export async function readForm(request: Request): Promise<FormData> {
  const known = forms.get(request);
  if (known) return known;
  const form = await request.formData().catch(() => {
    throw new Invalid({ "": ["The form could not be read. Send it again."] });
  });
  forms.set(request, form);
  return form;
}

/** Never sent back: passwords under any of their names ("current", "again" stand in the same forms), tokens. */
const SECRET_FIELD = /password|token|^(?:current|again)$/i;

function typedValues(request: Request): Record<string, string> {
  const values: Record<string, string> = {};
  for (const [name, value] of forms.get(request) ?? []) {
    if (typeof value !== "string" || SECRET_FIELD.test(name)) continue;
    // Boxes of one name come several times: one a line (form-state.ts reads them so).
    values[name] = Object.hasOwn(values, name) ? `${values[name]}\n${value}` : value;
  }
  return values;
}

function pageProblem(error: AppError): PageProblem {
  const { title, next } = answerFor(error);
  return { kind: error.kind, title, detail: error.message, next };
}

function retryHeaders(error: AppError): Record<string, string> {
  return error instanceof TooMany ? { "Retry-After": String(Math.ceil(error.retryAfterSeconds)) } : {};
}

/** A page's status reaches its answer, its headers do not: the root middleware sets this one from the context. */
function comeBackLater(error: AppError, { context }: Asked): void {
  if (error instanceof TooMany) context?.set(retryAfterContext, Math.ceil(error.retryAfterSeconds));
}

/**
 * What nobody foresaw: the log gets the error with the request's id, the page gets the id alone. Redirects and answers
 * that a loader throws on purpose are no errors and pass; a developer sees the error itself.
 */
export function broken(error: unknown, { context }: Asked): unknown {
  if (!(error instanceof Error) || process.env.NODE_ENV === "development") return error;
  const requestId = context?.get(requestIdContext) ?? "";
  logBroken(requestId, error);
  const { status, title, next } = answerForStatus(isConnectionError(error) ? 503 : 500);
  const body: PageProblem = { kind: "broken", title, detail: null, next, requestId };
  return data(body, { status });
}

/** One line to find it by, then the error with its stack. What a query was given stays out: it may be a mailed link. */
export function logBroken(requestId: string, error: unknown): void {
  const query = error instanceof Error && "query" in error ? ` in ${String(error.query)}` : "";
  console.error(`request ${requestId || "without an id"}${query}:`, query ? (error as Error).cause : error);
}

function brokenApi(error: unknown, { context }: Asked): Response {
  const requestId = context?.get(requestIdContext) ?? "";
  logBroken(requestId, error);
  const { status, title, next } = answerForStatus(isConnectionError(error) ? 503 : 500);
  return problem(status, title, `${next} The log knows this request as ${requestId}.`);
}

/** Wraps a page's loader: what a verb throws becomes the status and the words of the table in errors.ts. */
export function answered<A extends Asked, R>(read: (args: A) => Promise<R> | R): (args: A) => Promise<R> {
  return async (args) => {
    try {
      return await read(args);
    } catch (error) {
      if (!(error instanceof AppError)) throw broken(error, args);
      comeBackLater(error, args);
      throw data(pageProblem(error), { status: answerFor(error).status });
    }
  };
}

const BACK_TO_THE_FORM = new Set<ErrorKind>(["invalid", "conflict", "locked", "too-large", "too-many", "unavailable"]);

/** Wraps a page's action: what a person can mend goes back to their form, the rest to the error page. */
export function answeredAction<A extends Asked & { request: Request }, R>(act: (args: A) => Promise<R>) {
  return async (args: A) => {
    try {
      return await act(args);
    } catch (error) {
      if (!(error instanceof AppError)) throw broken(error, args);
      comeBackLater(error, args);
      const { status } = answerFor(error);
      if (!BACK_TO_THE_FORM.has(error.kind)) throw data(pageProblem(error), { status });
      const errors = error instanceof Invalid ? error.fields : { "": [error.message] };
      const links = error instanceof Invalid && error.links.length > 0 ? { links: error.links } : {};
      const problem: FormProblem = {
        problem: { kind: error.kind, message: error.message, errors, values: typedValues(args.request), ...links },
      };
      return data(problem, { status });
    }
  };
}

/** An RFC 9457 problem. `errors` names parameters or fields. */
export function problem(
  status: number,
  title: string,
  detail: string,
  errors: { parameter: string; message: string }[] = [],
  headers: Record<string, string> = {},
): Response {
  const body = { type: "about:blank", title, status, detail, ...(errors.length > 0 ? { errors } : {}) };
  return Response.json(body, { status, headers: { "Content-Type": "application/problem+json", ...headers } });
}

export function problemFor(error: AppError): Response {
  const { status, title } = answerFor(error);
  const errors =
    error instanceof Invalid
      ? Object.entries(error.fields).flatMap(([parameter, messages]) =>
          messages.map((message) => ({ parameter, message })),
        )
      : [];
  return problem(status, title, error.message, errors, retryHeaders(error));
}

/** Wraps a resource route: what a verb throws, or what breaks, becomes application/problem+json. */
export function answeredApi<A extends Asked>(
  answer: (args: A) => Promise<Response> | Response,
): (args: A) => Promise<Response> {
  return async (args) => {
    try {
      return await answer(args);
    } catch (error) {
      if (error instanceof AppError) return problemFor(error);
      if (!(error instanceof Error)) throw error;
      return brokenApi(error, args);
    }
  };
}

/** For an address that does not answer a method. `allow` names those it does, as RFC 9110 section 15.5.6 asks. */
export function methodNotAllowed(allow: string): Response {
  return problem(405, answerForStatus(405).title, `This address answers ${allow} only.`, [], { Allow: allow });
}

const LOOPBACK = new Set(["localhost", "127.0.0.1", "[::1]"]);

/** true where a page at `origin` may change things here. On this machine the loopback names are one place. */
export function isOwnOrigin(origin: string | null, publicUrl: string): boolean {
  if (!origin || !URL.canParse(origin)) return false;
  const from = new URL(origin);
  const own = new URL(publicUrl);
  if (from.origin === own.origin) return true;
  return (
    LOOPBACK.has(own.hostname) &&
    LOOPBACK.has(from.hostname) &&
    from.port === own.port &&
    from.protocol === own.protocol
  );
}

/** Every unsafe request, resource routes included, must come from one of our own pages. */
export const refuseForeignOrigins: MiddlewareFunction<Response> = async ({ request }, next) => {
  if (SAFE_METHODS.has(request.method) || isOwnOrigin(request.headers.get("Origin"), env().PUBLIC_URL)) return next();
  return problem(
    403,
    "This did not come from our own pages",
    "A request that changes something must carry the Origin of this application. Open the page here and send it again.",
  );
};

function contentSecurityPolicy(nonce: string): string {
  const developing = process.env.NODE_ENV === "development";
  // The development server injects styles and talks over a socket; what is served to people does neither.
  const style = developing ? "'self' 'unsafe-inline'" : `'self' 'nonce-${nonce}'`;
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}'`,
    `style-src ${style}`,
    // Positions set from script: the stage's canvas and dragging.
    "style-src-attr 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    `connect-src 'self'${developing ? " ws:" : ""}`,
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join("; ");
}

function answerToThrown(error: unknown, asked: Asked): Response {
  return error instanceof Response ? error : brokenApi(error, asked);
}

/** What a middleware says for a page reaches an address without a page as plain JSON; it is a problem there too. */
async function problemSaid(response: Response): Promise<Response> {
  if (response.status < 400 || !response.headers.get("Content-Type")?.startsWith("application/json")) return response;
  const said: Partial<PageProblem> | null = await response
    .clone()
    .json()
    .catch(() => null);
  if (!said?.title || !said.next) return response;
  const known = said.requestId ? ` The log knows this request as ${said.requestId}.` : "";
  return problem(response.status, said.title, (said.detail ?? said.next) + known);
}

const ONLY_LOOKED_AT = "GET, HEAD";

/** A route without an action is refused by the router: a page as a page, anything else as a problem, both with Allow. */
function methodSaid(response: Response): Response {
  if (response.status !== 405 || response.headers.has("Allow")) return response;
  if (!response.headers.get("Content-Type")?.startsWith("text/html")) return methodNotAllowed(ONLY_LOOKED_AT);
  response.headers.set("Allow", ONLY_LOOKED_AT);
  return response;
}

/** Nonce, request id and the usual headers, for pages and resource routes alike. */
export const hardenResponses: MiddlewareFunction<Response> = async ({ request, context }, next) => {
  const nonce = randomBytes(18).toString("base64");
  context.set(nonceContext, nonce);
  context.set(requestIdContext, randomBytes(9).toString("base64url"));
  // A page's failure comes back as its error page; what breaks before an address without a page is thrown to here.
  const said = await next().catch((error: unknown) => answerToThrown(error, { context }));
  const response = await problemSaid(methodSaid(said));
  const { headers } = response;
  const retryAfter = context.get(retryAfterContext);
  if (retryAfter !== null) headers.set("Retry-After", String(retryAfter));
  headers.set("Content-Security-Policy", contentSecurityPolicy(nonce));
  headers.set("X-Content-Type-Options", "nosniff");
  headers.set("X-Frame-Options", "DENY");
  headers.set("Referrer-Policy", "same-origin");
  headers.set("Cross-Origin-Opener-Policy", "same-origin");
  headers.set("Cross-Origin-Resource-Policy", "same-origin");
  headers.set("Permissions-Policy", "camera=(), microphone=(), geolocation=(), payment=()");
  headers.set("X-Request-Id", context.get(requestIdContext));
  if (env().PUBLIC_URL.startsWith("https:")) {
    headers.set("Strict-Transport-Security", "max-age=31536000; includeSubDomains");
  }
  if (!headers.has("Cache-Control") && !new URL(request.url).pathname.startsWith("/assets/")) {
    headers.set("Cache-Control", "private, no-store");
  }
  return response;
};
