import { redirect } from "react-router";
import type { Actor } from "#app/audit/actor.ts";
import { Invalid } from "#app/errors.ts";
import { addToCast } from "#app/exhibits/add-to-cast.server.ts";
import { bindFigure } from "#app/exhibits/bind-figure.server.ts";
import { AddToCast, LabelCast, OrderCast, RemoveFromCast, SetSceneMedia } from "#app/exhibits/exhibit-input.ts";
import { labelCast } from "#app/exhibits/label-cast.server.ts";
import { movedInOrder } from "#app/exhibits/order.ts";
import { orderCast } from "#app/exhibits/order-cast.server.ts";
import { readScene } from "#app/exhibits/read-scene.server.ts";
import { removeFromCast } from "#app/exhibits/remove-from-cast.server.ts";
import { saveScene } from "#app/exhibits/save-scene.server.ts";
import { saveWords } from "#app/exhibits/save-words.server.ts";
import { BindFigure, SaveWords, UnbindFigure } from "#app/exhibits/save-words-input.ts";
import { sceneFromForm } from "#app/exhibits/scene-form.ts";
import { setSceneMedia } from "#app/exhibits/set-scene-media.server.ts";
import { unbindFigure } from "#app/exhibits/unbind-figure.server.ts";
import { parseInput } from "#app/parse-input.ts";
import { authorise } from "#app/people/authorise.ts";

interface Place {
  exhibit: string;
  scene: string;
}

/** What the builder's forms do, by intent; each leads back to the tab it came from. */
const DEEDS: Record<string, { tab: string; act: (actor: Actor, form: FormData, place: Place) => Promise<void> }> = {
  "save-scene": { tab: "scale", act: (actor, form) => saveScene(actor, sceneFromForm(form)) },
  "add-to-cast": { tab: "", act: (actor, form) => addToCast(actor, parseInput(AddToCast, form)) },
  "remove-from-cast": { tab: "", act: (actor, form) => removeFromCast(actor, parseInput(RemoveFromCast, form)) },
  "label-cast": { tab: "", act: (actor, form) => labelCast(actor, parseInput(LabelCast, form)) },
  "order-cast": { tab: "", act: (actor, form) => orderCast(actor, parseInput(OrderCast, form)) },
  "move-cast": { tab: "", act: moveCast },
  "save-words": { tab: "words", act: (actor, form) => saveWords(actor, parseInput(SaveWords, form)) },
  bind: { tab: "words", act: (actor, form) => bindFigure(actor, parseInput(BindFigure, form)) },
  unbind: { tab: "words", act: (actor, form) => unbindFigure(actor, parseInput(UnbindFigure, form)) },
  "set-media": { tab: "picture", act: (actor, form) => setSceneMedia(actor, parseInput(SetSceneMedia, form)) },
};

async function moveCast(actor: Actor, form: FormData, place: Place): Promise<void> {
  authorise(actor, "exhibit.write");
  const { resolved } = await readScene(actor, place.exhibit, place.scene);
  const ids = resolved.cast.map((one) => one.recordId);
  const order = movedInOrder(ids, String(form.get("recordId")), form.get("by") === "-1" ? -1 : 1);
  await orderCast(actor, parseInput(OrderCast, { sceneId: place.scene, version: form.get("version"), order }));
}

export async function actOnScene(actor: Actor, form: FormData, place: Place, from: URL): Promise<Response> {
  const deed = DEEDS[String(form.get("intent"))];
  if (!deed) throw new Invalid({ "": ["This page cannot do that."] });
  await deed.act(actor, form, place);
  const tab = deed.tab || from.searchParams.get("tab") || "scale";
  return redirect(`/exhibits/${place.exhibit}/scenes/${place.scene}?tab=${tab}&said=kept`);
}
