import type { ReactNode } from "react";
import { Outlet, redirect, useLocation, useMatches, useRouteLoaderData } from "react-router";
import { actorContext } from "#app/context.server.ts";
import { env } from "#app/env.server.ts";
import { OfficeFrame } from "#app/ui/OfficeFrame.tsx";
import { pageFacts } from "#app/ui/page-handle.ts";
import type { ThemeChoice } from "#app/ui/theme-choice.ts";
import type { Route } from "./+types/office";
import { officePlaces, ROLE_WORDS } from "./office-places.ts";
import { errorTitle, RouteError } from "./RouteError.tsx";

/** Nobody enters the office without signing in; what each may do there is asked again by each verb. */
export const middleware: Route.MiddlewareFunction[] = [
  ({ context, request }) => {
    if (context.get(actorContext)) return;
    const { pathname, search } = new URL(request.url);
    throw redirect(`/sign-in?to=${encodeURIComponent(pathname + search)}`);
  },
];

export function loader({ context }: Route.LoaderArgs) {
  const actor = context.get(actorContext);
  const roles = actor?.roles ?? [];
  return {
    centre: env().CENTRE_NAME,
    person: { name: actor?.name ?? "", roles: roles.map((role) => ROLE_WORDS[role]) },
    places: officePlaces(roles),
  };
}

export const meta: Route.MetaFunction = ({ error }) => [{ title: error ? errorTitle(error) : "Alidade" }];

export default function Office({ loaderData }: Route.ComponentProps) {
  return (
    <Frame data={loaderData}>
      <Outlet />
    </Frame>
  );
}

/** What goes wrong on a page of the office is said inside the office: its places stay within reach. */
export function ErrorBoundary({ error, loaderData }: Route.ErrorBoundaryProps) {
  if (loaderData) {
    return (
      <Frame data={loaderData} margins>
        <RouteError error={error} />
      </Frame>
    );
  }
  return (
    <main id="main" tabIndex={-1} className="page">
      <RouteError error={error} />
    </main>
  );
}

interface FrameProps {
  data: Route.ComponentProps["loaderData"];
  /** Keep the margins, whatever the page that failed would have done. */
  margins?: boolean;
  children: ReactNode;
}

function Frame({ data, margins, children }: FrameProps) {
  const { pathname, search } = useLocation();
  const { bleed } = pageFacts(useMatches());
  const root = useRouteLoaderData<{ theme: ThemeChoice }>("root");
  return (
    <OfficeFrame {...data} theme={root?.theme ?? "system"} here={pathname + search} bleed={bleed && !margins}>
      {children}
    </OfficeFrame>
  );
}
