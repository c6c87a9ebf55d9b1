import type { ReactNode } from "react";
import { isRouteErrorResponse } from "react-router";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { RouteError } from "../RouteError.tsx";
import { Gate } from "./Gate.tsx";

interface SpentLinkProps {
  error: unknown;
  /** Where to go from here. */
  to: string;
  label: string;
  children: ReactNode;
}

/** A link from a mail that opens nothing any more: why, and how to come by another. Other errors are said as everywhere. */
export function SpentLink({ error, to, label, children }: SpentLinkProps) {
  if (!isRouteErrorResponse(error) || error.status !== 404) {
    return (
      <main id="main" tabIndex={-1} className="page">
        <RouteError error={error} />
      </main>
    );
  }
  return (
    <Gate title="This link opens nothing any more" lead={(error.data as { detail?: string } | null)?.detail}>
      <p className="mb-6">{children}</p>
      <LinkButton look="primary" to={to}>
        {label}
      </LinkButton>
    </Gate>
  );
}
