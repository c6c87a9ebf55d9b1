import type { readReview } from "#app/review/read-review.server.ts";
import { DiffRow } from "#app/ui/DiffRow.tsx";
import { Disclosure } from "#app/ui/Disclosure.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { Time } from "#app/ui/Time.tsx";

type Seals = Awaited<ReturnType<typeof readReview>>["seals"];

/** Who signed what, and what ended it, figure by figure. */
export function SealHistory({ seals }: { seals: Seals }) {
  if (seals.length === 0) return <p className="text-ink-soft">Nobody has signed anything yet.</p>;
  return (
    <ol className="border-t border-rule">
      {seals.map((seal) => (
        <li key={seal.id} className="border-b border-rule py-3">
          <p className="flex flex-wrap items-baseline gap-x-4">
            <StateMark tone={seal.voidedAt ? "none" : "sealed"}>
              {seal.voidedAt ? `${seal.kind}, ended` : seal.kind}
            </StateMark>
            <span>{seal.personName}</span>
            <span className="text-sm text-ink-soft">
              <Time at={seal.signedAt} form="moment" />
            </span>
            <code className="num text-sm text-ink-soft">{seal.digest.slice(0, 12)}</code>
          </p>
          {seal.note ? <p className="mt-1">{seal.note}</p> : null}
          {seal.voidReason ? <Ended reason={seal.voidReason} /> : null}
        </li>
      ))}
    </ol>
  );
}

function Ended({ reason }: { reason: NonNullable<Seals[number]["voidReason"]> }) {
  if (reason.why === "returned") {
    return (
      <p className="mt-1 text-ink-soft">
        Ended by {reason.by}
        {reason.note ? `: ${reason.note}` : "."}
      </p>
    );
  }
  const differing = reason.moved.filter((one) => one.readsDifferently).length;
  return (
    <Disclosure
      className="mt-1 border-b-0"
      open={differing > 0}
      summary={`Moved by ${reason.by}: ${differing} read differently, ${reason.moved.length - differing} read the same`}
    >
      {reason.moved.map((one) => (
        <DiffRow
          key={`${one.sceneTitle} ${one.what}`}
          label={`${one.sceneTitle}: ${one.what}`}
          before={one.before}
          after={one.after}
          verdict={
            <StateMark tone={one.readsDifferently ? "person" : "none"}>
              {one.readsDifferently ? "reads differently" : "reads the same"}
            </StateMark>
          }
        />
      ))}
    </Disclosure>
  );
}
