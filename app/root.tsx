import { type ReactNode, useContext } from "react";
import { Links, Meta, Outlet, Scripts, ScrollRestoration, useMatches, useRouteLoaderData } from "react-router";
import type { Route } from "./+types/root";
import "./app.css";
import { requestIdContext } from "./context.server.ts";
import { hardenResponses, refuseForeignOrigins } from "./http.server.ts";
import { findSession } from "./people/find-session.server.ts";
import { errorTitle, RouteError } from "./routes/RouteError.tsx";
import { NonceContext } from "./ui/nonce-context.ts";
import { pageFacts } from "./ui/page-handle.ts";
import { SkipLink } from "./ui/SkipLink.tsx";
import { themeFromCookie } from "./ui/theme-choice.ts";

export const middleware: Route.MiddlewareFunction[] = [hardenResponses, refuseForeignOrigins, findSession];

export const links: Route.LinksFunction = () => [{ rel: "icon", href: "/favicon.svg", type: "image/svg+xml" }];

export const meta: Route.MetaFunction = ({ error }) => [{ title: error ? errorTitle(error) : "Alidade" }];

export function loader({ request, context }: Route.LoaderArgs) {
  return { theme: themeFromCookie(request.headers.get("Cookie")), requestId: context.get(requestIdContext) };
}

export function Layout({ children }: { children: ReactNode }) {
  // Undefined when the root loader itself failed: the page must still stand.
  const data = useRouteLoaderData<typeof loader>("root");
  const nonce = useContext(NonceContext);
  const { ground, language } = pageFacts(useMatches());
  const theme = data?.theme === "system" ? undefined : data?.theme;
  return (
    <html lang={language} data-theme={theme}>
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="color-scheme" content={ground === "night" ? "dark" : (theme ?? "light dark")} />
        <Meta />
        {/* Style sheets are our own files and need no nonce; browsers do not hide one on a link, and hydration would differ. */}
        <Links nonce="" />
      </head>
      <body className={ground === "night" ? "night" : undefined}>
        {ground === "night" ? null : <SkipLink />}
        {children}
        <ScrollRestoration nonce={nonce} />
        <Scripts nonce={nonce} />
      </body>
    </html>
  );
}

export default function Root() {
  return <Outlet />;
}

export function ErrorBoundary({ error }: Route.ErrorBoundaryProps) {
  return (
    <main id="main" tabIndex={-1} className="page">
      <RouteError error={error} />
    </main>
  );
}
