import { PassThrough } from "node:stream";
import { createReadableStreamFromReadable } from "@react-router/node";
import { isbot } from "isbot";
import { renderToPipeableStream } from "react-dom/server";
import { type EntryContext, type HandleErrorFunction, type RouterContextProvider, ServerRouter } from "react-router";
import { nonceContext, requestIdContext } from "./context.server.ts";
import { logBroken } from "./http.server.ts";
// Seals are looked at again in every change (see DEVELOPERS.md, "The shelf").
import "./review/register.server.ts";
import { NonceContext } from "./ui/nonce-context.ts";

export const streamTimeout = 5_000;

/** Renders a page. The nonce of this request goes on every script that React and the router write. */
export default function handleRequest(
  request: Request,
  status: number,
  headers: Headers,
  entry: EntryContext,
  context: RouterContextProvider,
): Promise<Response> | Response {
  if (request.method === "HEAD") return new Response(null, { status, headers });
  const nonce = context.get(nonceContext) || undefined;
  // Crawlers and the static rendering wait for all of it; people see the shell as soon as it is there.
  const whole = isbot(request.headers.get("user-agent") ?? "") || entry.isSpaMode;
  return new Promise((resolve, reject) => {
    let answered = false;
    const answer = () => {
      answered = true;
      const body = new PassThrough();
      headers.set("Content-Type", "text/html; charset=utf-8");
      resolve(new Response(createReadableStreamFromReadable(body), { headers, status: failed ? 500 : status }));
      pipe(body);
    };
    let failed = false;
    const { pipe, abort } = renderToPipeableStream(
      <NonceContext value={nonce ?? ""}>
        <ServerRouter context={entry} url={request.url} nonce={nonce} />
      </NonceContext>,
      {
        nonce,
        onShellReady: whole ? undefined : answer,
        onAllReady: whole ? answer : undefined,
        onShellError: reject,
        onError(error) {
          failed = true;
          // Errors before the shell reject the promise and are reported there.
          if (answered) logBroken(context.get(requestIdContext), error);
        },
      },
    );
    // A second later than the loaders' own limit, so that their refusals still reach the page.
    setTimeout(abort, streamTimeout + 1000).unref();
  });
}

/** What broke outside the wrappers of http.server.ts. Somebody who went away in the middle is no error. */
export const handleError: HandleErrorFunction = (error, { request, context }) => {
  if (!request.signal.aborted) logBroken((context as RouterContextProvider).get(requestIdContext), error);
};
