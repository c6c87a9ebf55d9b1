import { Link } from "react-router";
import { answered } from "#app/http.server.ts";
import { readCaughtMail, readTroubledMail } from "#app/mail/read-caught-mail.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { EmptyState } from "#app/ui/EmptyState.tsx";
import { PageHead } from "#app/ui/PageHead.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { Table } from "#app/ui/Table.tsx";
import { Time } from "#app/ui/Time.tsx";
import type { Route } from "./+types/mails";

export const meta: Route.MetaFunction = () => [{ title: "Mail · Alidade" }];

export const loader = answered(async ({ context }: Route.LoaderArgs) => {
  authorise(requireActor(context), "mail.read");
  const [caught, troubled] = await Promise.all([readCaughtMail(), readTroubledMail()]);
  return {
    caught: caught?.map(({ id, to, subject, sentAt }) => ({ id, to, subject, sentAt })) ?? null,
    troubled: troubled.map((one) => ({
      id: one.id,
      attempts: one.attempts,
      lastError: one.lastError,
      createdAt: one.createdAt.toISOString(),
      state: one.failedAt ? ("given up" as const) : one.doneAt ? ("sent" as const) : ("waiting" as const),
    })),
  };
});

export default function Mails({ loaderData }: Route.ComponentProps) {
  const { caught, troubled } = loaderData;
  return (
    <>
      <PageHead
        title="Mail"
        subtitle={caught ? "caught on this machine; nothing leaves it" : "sent by the mail server"}
      />
      {troubled.length > 0 ? <Troubled rows={troubled} /> : null}
      {caught ? (
        <Table
          caption="Caught mail"
          captionHidden
          rows={caught}
          rowKey={(row) => row.id}
          empty={
            <EmptyState title="No mail yet">
              Mail is written when an exhibit changes hands, and for accounts.
            </EmptyState>
          }
          columns={[
            {
              id: "subject",
              head: "Subject",
              rowHead: true,
              cell: (row) => (
                <Link to={`/mail/${row.id}`} className="link">
                  {row.subject}
                </Link>
              ),
            },
            { id: "to", head: "To", cell: (row) => row.to },
            { id: "sent", head: "Sent", cell: (row) => <Time at={row.sentAt} form="moment" /> },
          ]}
        />
      ) : (
        <EmptyState title="Mail goes to people">
          A mail server is set (SMTP_URL), so nothing is caught here. What could not be sent stands above.
        </EmptyState>
      )}
    </>
  );
}

const TONE = { sent: "none", waiting: "person", "given up": "person" } as const;

function Troubled({ rows }: { rows: Route.ComponentProps["loaderData"]["troubled"] }) {
  return (
    <Table
      caption="Mail that had trouble"
      className="mb-10"
      rows={rows}
      rowKey={(row) => row.id}
      columns={[
        { id: "at", head: "Written", rowHead: true, cell: (row) => <Time at={row.createdAt} form="moment" /> },
        { id: "tries", head: "Tries", numeric: true, cell: (row) => row.attempts },
        { id: "why", head: "What the server said", cell: (row) => row.lastError ?? "" },
        { id: "state", head: "State", cell: (row) => <StateMark tone={TONE[row.state]}>{row.state}</StateMark> },
      ]}
    />
  );
}
