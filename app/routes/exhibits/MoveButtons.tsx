import { Form } from "react-router";
import { SubmitButton } from "#app/ui/SubmitButton.tsx";

interface MoveButtonsProps {
  name: string;
  /** Which form of the page's action this is: "move-scene", "move-cast". */
  intent: string;
  hidden: Readonly<Record<string, string | number>>;
  first: boolean;
  last: boolean;
}

/** The same as dragging, a place at a time; works without JavaScript. */
export function MoveButtons({ name, intent, hidden, first, last }: MoveButtonsProps) {
  return (
    <Form method="post" preventScrollReset className="flex">
      <input type="hidden" name="intent" value={intent} />
      {Object.entries(hidden).map(([key, value]) => (
        <input key={key} type="hidden" name={key} value={value} />
      ))}
      <SubmitButton
        name="by"
        value="-1"
        look="plain"
        pending="…"
        className="px-1.5"
        disabled={first}
        aria-label={`${name}: earlier`}
      >
        ↑
      </SubmitButton>
      <SubmitButton
        name="by"
        value="1"
        look="plain"
        pending="…"
        className="px-1.5"
        disabled={last}
        aria-label={`${name}: later`}
      >
        ↓
      </SubmitButton>
    </Form>
  );
}
