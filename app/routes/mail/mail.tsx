import { answered } from "#app/http.server.ts";
import { readOneCaughtMail } from "#app/mail/read-caught-mail.server.ts";
import { authorise } from "#app/people/authorise.ts";
import { requireActor } from "#app/people/require-actor.server.ts";
import { PageHead } from "#app/ui/PageHead.tsx";
import { Time } from "#app/ui/Time.tsx";
import type { Route } from "./+types/mail";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.mail.subject ?? "Mail"} · Alidade` },
];

export const loader = answered(async ({ context, params }: Route.LoaderArgs) => {
  authorise(requireActor(context), "mail.read");
  return { mail: await readOneCaughtMail(params.mail) };
});

/** Links in the text become links; nothing else of a mail is believed. */
function withLinks(text: string) {
  return text.split(/(https?:\/\/\S+)/).map((part, at) =>
    /^https?:\/\//.test(part) ? (
      // biome-ignore lint/suspicious/noArrayIndexKey: the parts of a text never change their order
      <a key={at} href={part} className="link break-all">
        {part}
      </a>
    ) : (
      part
    ),
  );
}

export default function Mail({ loaderData: { mail } }: Route.ComponentProps) {
  return (
    <>
      <PageHead title={mail.subject} crumbs={[{ label: "Mail", to: "/mail" }]} subtitle={`to ${mail.to}`} />
      <p className="mb-6 text-ink-soft">
        <Time at={mail.sentAt} form="moment" />
      </p>
      <div className="max-w-words whitespace-pre-line">{withLinks(mail.text)}</div>
    </>
  );
}
