import { useSearchParams } from "react-router";
import { actorContext } from "#app/context.server.ts";
import { Invalid } from "#app/errors.ts";
import { answered, answeredAction } from "#app/http.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { Tabs } from "#app/ui/Tabs.tsx";
import type { Route } from "./+types/pattern-book";
import { FormPatterns } from "./pattern-book/FormPatterns.tsx";
import { NumberPatterns } from "./pattern-book/NumberPatterns.tsx";
import { StatePatterns } from "./pattern-book/StatePatterns.tsx";
import { TablePatterns } from "./pattern-book/TablePatterns.tsx";

export const meta: Route.MetaFunction = () => [{ title: "Pattern book · Alidade" }];

export const loader = answered(({ context }: Route.LoaderArgs) => {
  authorise(context.get(actorContext), "people.manage");
  return null;
});

/** Answers as a refused form would, so that the fields can be seen in that state. Nothing is kept. */
export const action = answeredAction(async ({ context }: Route.ActionArgs): Promise<null> => {
  authorise(context.get(actorContext), "people.manage");
  throw new Invalid({
    "": ["Nothing was saved: this book keeps nothing."],
    parallax: ["Write the parallax as a number, such as 130.23."],
    source: ["Choose where it was published."],
  });
});

const CHAPTERS = [
  { id: "numbers", label: "Numbers", Chapter: NumberPatterns },
  { id: "forms", label: "Forms", Chapter: FormPatterns },
  { id: "tables", label: "Tables and lists", Chapter: TablePatterns },
  { id: "states", label: "States and messages", Chapter: StatePatterns },
] as const;

/** Each part of ui/ in each of its states, in this person's light, for whoever builds a page. */
export default function PatternBook({ actionData }: Route.ComponentProps) {
  const [query] = useSearchParams();
  const current = CHAPTERS.find(({ id }) => id === query.get("chapter")) ?? CHAPTERS[0];
  const tabs = CHAPTERS.map(({ id, label }) => ({ to: `?chapter=${id}`, label, current: id === current.id }));
  return (
    <>
      <PageHead
        crumbs={[{ label: "Desk", to: "/desk" }]}
        title="Pattern book"
        subtitle="every part of the interface, in each of its states"
        state={
          <StateMark tone="vetted" large>
            in use
          </StateMark>
        }
        actions={<LinkButton to="?chapter=states&ask=withdraw#dialog">Ask a question</LinkButton>}
      />
      <Tabs label="Chapters" tabs={tabs} />
      <current.Chapter errors={actionData?.problem.errors} />
    </>
  );
}
