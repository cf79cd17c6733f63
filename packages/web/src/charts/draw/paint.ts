import type { Scene } from '../scene/marks';
import { drawScene } from './draw-scene';

/** Draws a picture on a canvas, as sharp as the screen is. */
export function paint(canvas: HTMLCanvasElement, scene: Scene): void {
  const pen = canvas.getContext('2d');
  if (!pen) return;
  const ratio = Math.max(1, window.devicePixelRatio);
  const [width, height] = [Math.round(scene.width * ratio), Math.round(scene.height * ratio)];
  if (canvas.width !== width) canvas.width = width;
  if (canvas.height !== height) canvas.height = height;
  pen.setTransform(ratio, 0, 0, ratio, 0, 0);
  drawScene(pen, scene);
}
