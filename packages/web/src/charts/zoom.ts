import { select } from 'd3-selection';
import { type ZoomTransform, zoom, zoomIdentity, zoomTransform } from 'd3-zoom';
import type { View } from './scene/chart-data';
import type { Box } from './scene/marks';

const closest = 20;

export interface Zoomer {
  by(factor: number): void;
  whole(): void;
  stop(): void;
}

/**
 * Lets a picture be zoomed and panned about its plot: by pinching, by the wheel with Ctrl, by dragging once it is
 * zoomed. A plain wheel and a single finger are left to the page while the whole picture is seen.
 */
export function zoomOn(element: HTMLElement, plot: () => Box, onView: (view: View) => void): Zoomer {
  const behaviour = zoom<HTMLElement, unknown>()
    .scaleExtent([1, closest])
    .extent(() => extentOf(plot()))
    .constrain((transform, [[left, top], [right, bottom]]) => {
      const { k } = transform;
      const x = Math.min(left * (1 - k), Math.max(right * (1 - k), transform.x));
      const y = Math.min(top * (1 - k), Math.max(bottom * (1 - k), transform.y));
      return zoomIdentity.translate(x, y).scale(k);
    })
    .filter((event: MouseEvent | TouchEvent | WheelEvent) => {
      if (event.type === 'wheel') return event.ctrlKey || event.metaKey;
      const zoomedIn = zoomTransform(element).k > 1;
      if ('touches' in event) return zoomedIn || event.touches.length > 1;
      return event.type === 'dblclick' || (zoomedIn && event.button === 0);
    })
    // A pinch comes in small steps, a wheel's notch in large ones.
    .wheelDelta(({ deltaY, deltaMode }) => {
      return -deltaY * (deltaMode === 1 ? 0.05 : deltaMode ? 1 : Math.abs(deltaY) < 40 ? 0.012 : 0.003);
    })
    .duration(0)
    .on('zoom', ({ transform }: { transform: ZoomTransform }) => {
      const { x, y } = plot();
      // From the element's corner to the plot's.
      onView({
        k: transform.k,
        x: transform.x - x * (1 - transform.k),
        y: transform.y - y * (1 - transform.k),
      });
    });
  const selection = select(element).call(behaviour);
  return {
    by: (factor) => behaviour.scaleBy(selection, factor),
    whole: () => behaviour.transform(selection, zoomIdentity),
    stop: () => {
      selection.on('.zoom', null);
    },
  };
}

const extentOf = ({ x, y, width, height }: Box): [[number, number], [number, number]] => [
  [x, y],
  [x + width, y + height],
];
