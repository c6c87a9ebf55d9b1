import type { Camera, Scene } from "three";
import type { Rgb } from "./colour.ts";
import type { Fonts } from "./font.ts";
import { type FrameMemory, type PlacedLabel, renderFrame } from "./frame.ts";
import { type Picked, pickStar } from "./pick.ts";

export interface RasterRendererOptions {
  canvas: HTMLCanvasElement;
  background?: Rgb;
  fonts?: Fonts | null;
  /** Enlarges stars, lines and letters beyond the screen's pixel ratio: a kiosk is read from farther away. */
  scale?: number;
}

/** Draws on a 2d canvas, with what @react-three/fiber asks of a renderer. */
export class RasterRenderer {
  readonly domElement: HTMLCanvasElement;
  /** What the last frame's labels said and where, px of the picture. */
  labels: PlacedLabel[] = [];
  fonts: Fonts | null;
  background: Rgb;
  scale: number;
  private readonly context: CanvasRenderingContext2D;
  private memory: FrameMemory | null = null;
  private pixelRatio = 1;
  private cssWidth = 1;
  private cssHeight = 1;
  private last: { scene: Scene; camera: Camera } | null = null;

  /** @throws Error when the canvas has no 2d context to give */
  constructor({ canvas, background = [0, 0, 0], fonts = null, scale = 1 }: RasterRendererOptions) {
    const context = canvas.getContext("2d", { alpha: false });
    if (!context) throw new Error("the canvas has no 2d context");
    this.domElement = canvas;
    this.context = context;
    this.background = background;
    this.fonts = fonts;
    this.scale = scale;
  }

  setPixelRatio(pixelRatio: number): void {
    this.pixelRatio = pixelRatio;
    this.resize();
  }

  setSize(width: number, height: number, updateStyle = true): void {
    this.cssWidth = width;
    this.cssHeight = height;
    if (updateStyle) {
      this.domElement.style.width = `${width}px`;
      this.domElement.style.height = `${height}px`;
    }
    this.resize();
  }

  render(scene: Scene, camera: Camera): void {
    const { width, height } = this.domElement;
    const { background, fonts, memory } = this;
    const pixelRatio = this.pixelRatio * this.scale;
    const frame = renderFrame(scene, camera, {
      width,
      height,
      pixelRatio,
      background,
      fonts,
      ...(memory ? { memory } : {}),
    });
    this.memory = frame.memory;
    this.labels = frame.labels;
    this.last = { scene, camera };
    this.context.putImageData(new ImageData(frame.data, width, height), 0, 0);
  }

  /** The star under a place of the last frame, css px from the canvas's corner. */
  pickAt(x: number, y: number, radiusPx = 24): Picked | null {
    if (!this.last) return null;
    const size = { width: this.cssWidth, height: this.cssHeight };
    return pickStar(this.last.scene, this.last.camera, size, x, y, radiusPx);
  }

  dispose(): void {
    this.memory = null;
    this.last = null;
    this.labels = [];
  }

  private resize(): void {
    const width = Math.max(1, Math.floor(this.cssWidth * this.pixelRatio));
    const height = Math.max(1, Math.floor(this.cssHeight * this.pixelRatio));
    if (this.domElement.width === width && this.domElement.height === height) return;
    this.domElement.width = width;
    this.domElement.height = height;
    this.memory = null;
  }
}
