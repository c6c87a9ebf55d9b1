import { Form } from "react-router";
import { classes } from "./classes.ts";
import { THEME_CHOICES, type ThemeChoice } from "./theme-choice.ts";

export type { ThemeChoice };

/** Three buttons and no script: the choice goes into a cookie and the page comes back in it. */
export function ThemeForm({ theme, here }: { theme: ThemeChoice; here: string }) {
  return (
    <Form method="post" action="/theme" preventScrollReset>
      <fieldset className="flex flex-wrap items-center gap-x-3">
        <legend className="text-ink-soft">Light</legend>
        <input type="hidden" name="here" value={here} />
        {THEME_CHOICES.map((choice) => (
          <button
            key={choice}
            type="submit"
            name="theme"
            value={choice}
            aria-pressed={choice === theme}
            className={classes(
              "min-h-8 border-b-2",
              choice === theme
                ? "border-ink font-medium text-ink"
                : "border-transparent text-ink-soft forced-colors:border-[Canvas] hover:text-ink",
            )}
          >
            {WORDS[choice]}
          </button>
        ))}
      </fieldset>
    </Form>
  );
}

const WORDS: Record<ThemeChoice, string> = { system: "auto", light: "day", dark: "lamp" };
