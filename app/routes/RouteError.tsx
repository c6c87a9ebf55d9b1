import { isRouteErrorResponse, useLocation, useRouteLoaderData } from "react-router";
import { answerForStatus } from "#app/errors.ts";
import { ErrorPage } from "#app/ui/ErrorPage.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";

/** The page of a refusal or a failure: what happened, and what to do next, from the one table in errors.ts. */
export function RouteError({ error }: { error: unknown }) {
  const location = useLocation();
  const here = location.pathname + location.search;
  const { status, title, next } = answerTo(error);
  // The root's own id is that of the request which brought this page: right for what broke while it was written.
  const root = useRouteLoaderData<{ requestId?: string }>("root");
  return (
    <ErrorPage
      status={status === null ? undefined : String(status)}
      title={title}
      detail={detailOf(error)}
      next={next}
      reference={status !== null && status >= 500 ? (requestIdOf(error) ?? root?.requestId) : undefined}
      stack={import.meta.env.DEV && error instanceof Error ? error.stack : undefined}
      actions={
        <>
          {status === 401 ? (
            <LinkButton look="primary" to={`/sign-in?to=${encodeURIComponent(here)}`}>
              Sign in
            </LinkButton>
          ) : null}
          {status === null || status === 409 || status >= 500 ? (
            <LinkButton look="primary" to={here} reloadDocument>
              Load it again
            </LinkButton>
          ) : null}
          <LinkButton to="/">Go to the desk</LinkButton>
        </>
      }
    />
  );
}

/** For the `meta` of a route with an error boundary. */
export function errorTitle(error: unknown): string {
  return `${answerTo(error).title} · Alidade`;
}

const UNREACHABLE = {
  status: null,
  title: "The office cannot be reached",
  next: "Look whether this machine is on the network. What you have typed stays on the page before this one.",
};

function answerTo(error: unknown) {
  return isUnreachable(error) ? UNREACHABLE : answerForStatus(isRouteErrorResponse(error) ? error.status : 500);
}

/** A browser's fetch fails with a TypeError when no answer comes at all. */
function isUnreachable(error: unknown): boolean {
  return error instanceof TypeError && /fetch|network|load failed/i.test(error.message);
}

/** Only words that were written for people: never the message of an unexpected error. */
function detailOf(error: unknown): string | undefined {
  if (!isRouteErrorResponse(error)) return undefined;
  const body: unknown = error.data;
  if (typeof body === "object" && body !== null && "detail" in body && typeof body.detail === "string") {
    return body.detail;
  }
  // The router's own refusals arrive as "Error: No route matches…".
  return typeof body === "string" && body !== "" && !body.startsWith("Error:") ? body : undefined;
}

function requestIdOf(error: unknown): string | undefined {
  const body: unknown = isRouteErrorResponse(error) ? error.data : null;
  const known = typeof body === "object" && body !== null && "requestId" in body;
  return known && typeof body.requestId === "string" ? body.requestId : undefined;
}
