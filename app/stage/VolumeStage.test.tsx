import { renderToString } from "react-dom/server";
import { expect, test, vi } from "vitest";
import { SceneDocument } from "#app/scene/document.ts";
import { StillOnFailure } from "./StillOnFailure.tsx";
import { VolumeStage } from "./VolumeStage.tsx";

const asked = vi.hoisted(() => ({ canvas: 0 }));

// The canvas comes to browsers only; three would come with any import that is not lazy, and fail this file.
vi.mock("./StageCanvas.tsx", () => {
  asked.canvas += 1;
  return { default: () => null };
});
vi.mock("three", () => {
  throw new Error("three was asked for on the server");
});

const scene = SceneDocument.parse({ kind: "volume" });
const stage = (stillUrl: string | null) => (
  <VolumeStage document={scene} members={[]} language="en" stillUrl={stillUrl} stillAlt="Seven stars." />
);

test("before it is woken, and without scripts, the stage is the still with its words, and no control that does nothing", async () => {
  const html = renderToString(stage("/stills/seven.png"));
  expect(html).toContain('<img src="/stills/seven.png" alt="Seven stars."');
  expect(html).not.toMatch(/<canvas|<button|role="application"/);
  // An import that rendering began would be done by then.
  await new Promise((resolve) => setTimeout(resolve, 50));
  expect(asked.canvas).toBe(0);
});

test("without a still there is no broken picture", () => {
  expect(renderToString(stage(null))).not.toContain("<img");
});

test("what holds the canvas shows nothing once it has failed, and tells", () => {
  expect(StillOnFailure.getDerivedStateFromError()).toEqual({ failed: true });
  const told = vi.fn();
  const holder = new StillOnFailure({ onFailure: told, children: "canvas" });
  expect(holder.render()).toBe("canvas");
  holder.state = { failed: true };
  holder.componentDidCatch();
  expect(holder.render()).toBeNull();
  expect(told).toHaveBeenCalledOnce();
});
