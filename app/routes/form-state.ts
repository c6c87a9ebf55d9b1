import type { FormProblem } from "#app/http.server.ts";

type ActionData = FormProblem | { problem?: undefined } | undefined | null;

/**
 * What a form shows: what was typed if it was refused, otherwise what is kept. On a page with several forms each names
 * its `intent` and sees only its own refusal.
 */
export function formState(
  actionData: ActionData,
  saved: Readonly<Record<string, string | number | null | undefined>> = {},
  intent?: string,
) {
  const refused = actionData?.problem;
  const problem = refused && (intent === undefined || refused.values.intent === intent) ? refused : undefined;
  return {
    errors: problem?.errors,
    links: problem?.links,
    error: (name: string) => problem?.errors[name],
    value: (name: string) => problem?.values[name] ?? saved[name]?.toString() ?? "",
    /** For boxes of one name: which were ticked, after a refusal, otherwise which are kept. */
    chosen: <T extends string>(name: string, kept: readonly T[]): readonly T[] =>
      problem ? ((problem.values[name]?.split("\n") ?? []) as T[]) : kept,
    /** For boxes: an unticked box is not sent, so after a refusal its absence counts. */
    ticked: (name: string, kept: boolean) => (problem ? problem.values[name] !== undefined : kept),
  };
}
