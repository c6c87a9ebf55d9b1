import { Form, useSearchParams } from "react-router";
import { Dialog } from "#app/ui/Dialog.tsx";
import { ErrorPage } from "#app/ui/ErrorPage.tsx";
import { LinkButton } from "#app/ui/LinkButton.tsx";
import { Notice } from "#app/ui/Notice.tsx";
import { Progress } from "#app/ui/Progress.tsx";
import { StateMark } from "#app/ui/StateMark.tsx";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";
import { TextArea } from "#app/ui/TextArea.tsx";
import { Pattern } from "./Chapter.tsx";

const HERE = "?chapter=states";

export function StatePatterns() {
  const [query] = useSearchParams();
  return (
    <>
      <div className="grid gap-x-14 lg:grid-cols-2">
        <Pattern title="Notices">
          <Notice title="For your information">Edition 4 is live on two kiosks.</Notice>
          <Notice tone="success">The measurement was saved.</Notice>
          <Notice tone="warning" title="Two peaks">
            This posterior has two peaks; one number would hide the other.
          </Notice>
          <Notice tone="error" title="Nothing was saved">
            The storage did not answer. Try again in a minute.
          </Notice>
        </Pattern>
        <Pattern title="State marks">
          <p className="flex flex-wrap gap-5">
            <StateMark tone="vetted">vetted</StateMark>
            <StateMark tone="live">live on 2 kiosks</StateMark>
            <StateMark tone="sealed">sealed, waiting</StateMark>
            <StateMark tone="person">needs a source</StateMark>
            <StateMark tone="none">draft</StateMark>
          </p>
          <p className="mt-5 flex flex-wrap gap-5">
            <StateMark tone="sealed" large>
              sealed 14 November
            </StateMark>
            <StateMark tone="person" large>
              needs a person
            </StateMark>
          </p>
        </Pattern>
        <Pattern title="Progress">
          <div className="grid gap-5">
            <Progress id="rows" label="Checking rows" value={0.26} text="312 of 1,204 rows" />
            <Progress id="waiting" label="Waiting for the worker" text="not begun" />
          </div>
        </Pattern>
        <Pattern title="A question over the page">
          <LinkButton look="danger" to={`${HERE}&ask=withdraw#dialog`} preventScrollReset>
            Withdraw…
          </LinkButton>
        </Pattern>
      </div>
      <Pattern title="An error page">
        <div className="border-t border-rule">
          <ErrorPage
            heading="h3"
            status="409"
            title="It changed in the meantime"
            detail="Ines Duarte saved this record four minutes ago."
            next="Load the page again to see how it stands now; what you typed is still in your form."
            actions={<LinkButton to={HERE}>Load it again</LinkButton>}
          />
        </div>
      </Pattern>
      {query.get("ask") === "withdraw" ? (
        <Dialog title="Withdraw this exhibit?" closeTo={HERE}>
          <Form method="post" className="grid gap-5">
            <p>Two kiosks show it now. They will go back to edition 3 when nobody touches them.</p>
            <TextArea label="Why" name="why" required rows={2} />
            <div className="flex gap-3">
              <SubmitButton look="danger" intent="withdraw" pending="Withdrawing…">
                Withdraw it
              </SubmitButton>
              <LinkButton to={HERE} preventScrollReset>
                Keep it
              </LinkButton>
            </div>
          </Form>
        </Dialog>
      ) : null}
    </>
  );
}
