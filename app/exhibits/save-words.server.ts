import { eq } from "drizzle-orm";
import type { z } from "zod";
import type { Actor } from "#app/audit/actor.ts";
import { change } from "#app/audit/change.server.ts";
import { LANGUAGES } from "#app/database/enums.ts";
import { sceneFigure, sceneWords } from "#app/database/schema/exhibits.ts";
import { type FieldErrors, Invalid } from "#app/errors.ts";
import { authorise } from "#app/people/authorise.ts";
import { closeScene, openScene } from "./open-exhibit.server.ts";
import type { SaveWords } from "./save-words-input.ts";
import { figureKeys } from "./words.ts";

/**
 * The words of a scene in each language.
 * @throws Invalid at the language that names a figure which is not bound.
 */
export async function saveWords(actor: Actor | null, input: z.output<typeof SaveWords>): Promise<void> {
  authorise(actor, "exhibit.write");
  await change(actor, "exhibit.save-words", async (c) => {
    const opened = await openScene(c, input.sceneId);
    const bound = await c.tx.select().from(sceneFigure).where(eq(sceneFigure.sceneId, opened.scene.id));
    refuseUnbound(input, new Set(bound.map((figure) => figure.key)));
    const rows = await c.tx.select().from(sceneWords).where(eq(sceneWords.sceneId, opened.scene.id));
    const before = Object.fromEntries(LANGUAGES.map((l) => [l, rows.find((row) => row.language === l)?.body ?? ""]));
    const after = Object.fromEntries(LANGUAGES.map((l) => [l, input[l].replace(/\r\n?/g, "\n").trim()]));
    if (LANGUAGES.every((language) => before[language] === after[language])) return c.unchanged();
    for (const language of LANGUAGES) {
      const body = after[language] ?? "";
      await c.tx
        .insert(sceneWords)
        .values({ sceneId: opened.scene.id, language, body })
        .onDuplicateKeyUpdate({ set: { body } });
    }
    await closeScene(c, opened, input.version, {}, { before, after });
  });
}

function refuseUnbound(input: z.output<typeof SaveWords>, bound: Set<string>): void {
  const fields: FieldErrors = {};
  for (const language of LANGUAGES) {
    const unbound = figureKeys(input[language]).filter((key) => !bound.has(key));
    if (unbound.length === 0) continue;
    fields[language] = [`No figure is bound to ${unbound.map((key) => `{${key}}`).join(", ")}. Bind it first.`];
  }
  if (Object.keys(fields).length > 0) throw new Invalid(fields);
}
