import type { Mark, Place, Scene } from '../scene/marks';
import { pathLine, slants } from './draw-scene';

/** A picture as an SVG file, with its title and finding as text for those who cannot see it. */
export function writeSvg(scene: Scene, words: { title: string; description: string }): string {
  const { width, height, background, font, marks } = scene;
  let clips = 0;

  const write = (mark: Mark): string => {
    switch (mark.kind) {
      case 'box': {
        const { fill, hatch, box } = mark;
        if (box.width <= 0 || box.height <= 0) return '';
        const d = hatch
          ? slants(box)
              .map(([from, to]) => `M${places(from)}L${places(to)}`)
              .join('')
          : '';
        return `<rect ${rectangle(box)} fill="${fill}"/>${
          hatch ? clipped(box, `<path d="${d}" stroke="${hatch}" fill="none"/>`) : ''
        }`;
      }
      case 'line':
        return `<path d="M${places(mark.from)}L${places(mark.to)}" ${stroked(mark)}/>`;
      case 'path':
        return `<path d="${pathLine(mark.smooth).digits(2)([...mark.points]) ?? ''}" ${stroked(mark)}/>`;
      case 'disc': {
        const [cx, cy] = mark.at.map(rounded);
        const edge = mark.width > 0 ? ` stroke="${mark.stroke}" stroke-width="${mark.width}"` : '';
        return `<circle cx="${cx}" cy="${cy}" r="${mark.radius}" fill="${mark.fill}"${edge}/>`;
      }
      case 'text': {
        const [x, y] = mark.at.map(rounded);
        const halo = mark.halo ? ` stroke="${mark.halo}" stroke-width="3" paint-order="stroke"` : '';
        return `<text x="${x}" y="${y}" dy=".35em" font-size="${mark.size}" font-weight="${mark.weight}" text-anchor="${mark.align}" fill="${mark.fill}"${halo}>${escaped(mark.text)}</text>`;
      }
      case 'clip':
        return clipped(mark.box, mark.marks.map(write).join('\n'));
    }
  };

  const clipped = (box: { x: number; y: number; width: number; height: number }, inner: string): string => {
    clips += 1;
    return `<clipPath id="clip${clips}"><rect ${rectangle(box)}/></clipPath><g clip-path="url(#clip${clips})">${inner}</g>`;
  };

  return `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="${height}" viewBox="0 0 ${width} ${height}" role="img" font-family="${escaped(font)}" stroke-linejoin="round">
<title>${escaped(words.title)}</title>
<desc>${escaped(words.description)}</desc>
<rect width="${width}" height="${height}" fill="${background}"/>
${marks.map(write).join('\n')}
</svg>
`;
}

const rounded = (value: number): number => Math.round(100 * value) / 100;

const places = ([x, y]: Place): string => `${rounded(x)},${rounded(y)}`;

const rectangle = (box: { x: number; y: number; width: number; height: number }): string =>
  `x="${rounded(box.x)}" y="${rounded(box.y)}" width="${rounded(box.width)}" height="${rounded(box.height)}"`;

function stroked(mark: { stroke: string; width: number; dash?: readonly number[] }): string {
  const dash = mark.dash ? ` stroke-dasharray="${mark.dash.join(' ')}"` : '';
  return `fill="none" stroke="${mark.stroke}" stroke-width="${mark.width}"${dash}`;
}

const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };

const escaped = (text: string): string => text.replace(/[&<>"]/g, (sign) => entities[sign] as string);
