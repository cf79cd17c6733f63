import { curveCatmullRom, curveLinear, line } from 'd3-shape';
import type { Box, BoxMark, DiscMark, Mark, PathMark, Place, Scene, TextMark } from '../scene/marks';

/** The part of a canvas context that a picture needs. */
export type Pen = Pick<
  CanvasRenderingContext2D,
  | 'arc'
  | 'arcTo'
  | 'beginPath'
  | 'bezierCurveTo'
  | 'clip'
  | 'closePath'
  | 'fill'
  | 'fillRect'
  | 'fillStyle'
  | 'fillText'
  | 'font'
  | 'lineCap'
  | 'lineJoin'
  | 'lineTo'
  | 'lineWidth'
  | 'moveTo'
  | 'quadraticCurveTo'
  | 'rect'
  | 'restore'
  | 'save'
  | 'setLineDash'
  | 'stroke'
  | 'strokeStyle'
  | 'strokeText'
  | 'textAlign'
  | 'textBaseline'
>;

/** Draws a picture, mark by mark. */
export function drawScene(pen: Pen, { width, height, background, font, marks }: Scene): void {
  pen.fillStyle = background;
  pen.fillRect(0, 0, width, height);
  pen.lineJoin = 'round';
  pen.lineCap = 'butt';
  pen.textBaseline = 'middle';
  drawAll(pen, marks, font);
}

function drawAll(pen: Pen, marks: readonly Mark[], font: string): void {
  for (const mark of marks) draw(pen, mark, font);
}

function draw(pen: Pen, mark: Mark, font: string): void {
  switch (mark.kind) {
    case 'box':
      drawBox(pen, mark);
      break;
    case 'line':
      stroke(pen, mark, () => {
        pen.moveTo(...mark.from);
        pen.lineTo(...mark.to);
      });
      break;
    case 'path':
      stroke(pen, mark, () => trace(pen, mark));
      break;
    case 'disc':
      drawDisc(pen, mark);
      break;
    case 'text':
      drawText(pen, mark, font);
      break;
    case 'clip':
      pen.save();
      pen.beginPath();
      pen.rect(mark.box.x, mark.box.y, mark.box.width, mark.box.height);
      pen.clip();
      drawAll(pen, mark.marks, font);
      pen.restore();
  }
}

function trace(pen: Pen, { points, smooth }: PathMark): void {
  pathLine(smooth).context(pen as CanvasRenderingContext2D)([...points]);
}

/** How a path runs through its points. */
export const pathLine = (smooth = false) => line<Place>().curve(smooth ? curveCatmullRom : curveLinear);

function drawDisc(pen: Pen, { at, radius, fill, stroke: edge, width }: DiscMark): void {
  pen.beginPath();
  pen.arc(...at, radius, 0, 2 * Math.PI);
  pen.fillStyle = fill;
  pen.fill();
  if (width === 0) return;
  pen.setLineDash([]);
  pen.strokeStyle = edge;
  pen.lineWidth = width;
  pen.stroke();
}

interface Stroked {
  stroke: string;
  width: number;
  dash?: readonly number[];
}

function stroke(pen: Pen, { stroke: colour, width, dash = [] }: Stroked, path: () => void): void {
  pen.beginPath();
  path();
  pen.setLineDash([...dash]);
  pen.strokeStyle = colour;
  pen.lineWidth = width;
  pen.stroke();
}

function drawBox(pen: Pen, { box, fill, hatch }: BoxMark): void {
  if (box.width <= 0 || box.height <= 0) return;
  pen.fillStyle = fill;
  pen.fillRect(box.x, box.y, box.width, box.height);
  if (!hatch) return;
  pen.save();
  pen.beginPath();
  pen.rect(box.x, box.y, box.width, box.height);
  pen.clip();
  stroke(pen, { stroke: hatch, width: 1 }, () => {
    for (const [from, to] of slants(box)) {
      pen.moveTo(...from);
      pen.lineTo(...to);
    }
  });
  pen.restore();
}

/** Slanting lines that cover a box, the same however far it reaches to the right. */
export function slants({ x, y, width, height }: Box): [from: Place, to: Place][] {
  const lines: [Place, Place][] = [];
  const right = x + width;
  for (let at = right; at > x - height; at -= 9)
    lines.push([
      [at, y + height],
      [at + height, y],
    ]);
  return lines;
}

function drawText(pen: Pen, { at, text, fill, size, weight, align, halo }: TextMark, font: string): void {
  pen.font = `${weight} ${size}px ${font}`;
  pen.textAlign = align === 'middle' ? 'center' : align;
  if (halo) {
    pen.setLineDash([]);
    pen.strokeStyle = halo;
    pen.lineWidth = 3;
    pen.strokeText(text, ...at);
  }
  pen.fillStyle = fill;
  pen.fillText(text, ...at);
}
