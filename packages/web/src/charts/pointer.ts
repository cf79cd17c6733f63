import type { Place } from './scene/marks';

/** Where a pointer is, from an element's upper left corner. */
export function placeIn(
  element: HTMLElement | null,
  { clientX, clientY }: { clientX: number; clientY: number },
): Place {
  const { left = 0, top = 0 } = element?.getBoundingClientRect() ?? {};
  return [clientX - left, clientY - top];
}

/** To the side of a place where there is more room. */
export function besides([x, y]: Place, width: number, height: number) {
  return {
    ...(x < width / 2 ? { left: x + 22 } : { right: width - x + 22 }),
    ...(y < height / 2 ? { top: y + 10 } : { bottom: height - y + 10 }),
  };
}
