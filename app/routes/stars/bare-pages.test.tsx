import type { ReactElement } from "react";
import { renderToString } from "react-dom/server";
import { createMemoryRouter, RouterProvider } from "react-router";
import { expect, test } from "vitest";
import { Ledger } from "./Ledger.tsx";
import Stars from "./stars.tsx";

// Pages of which there is nothing yet: the first a person ever sees.

function render(element: ReactElement): string {
  const router = createMemoryRouter([{ path: "/", element }], { hydrationData: { loaderData: {} } });
  return renderToString(<RouterProvider router={router} />);
}

const query = { search: "", state: null, sort: "name" as const, descending: false, after: null, before: null };

test.each([
  ["", "The catalogue is empty"],
  ["no such star", "No record fits"],
])("the table of stars without rows, searched for %j, says %j", (search, words) => {
  const loaderData = { rows: [], total: 0, previous: null, next: null, query: { ...query, search }, mayWrite: true };
  const html = render(<Stars {...({ loaderData } as unknown as Parameters<typeof Stars>[0])} />);
  expect(html).toContain(words);
});

test("the ledger of a record without measurements says so", () => {
  expect(render(<Ledger ledger={[]} adoptedId={null} actionData={undefined} />)).toContain("No parallax is kept yet.");
});
