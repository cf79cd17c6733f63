import { type Frame, textSize } from './axes';
import type { ChartData, ChartRule, Look } from './chart-data';
import { mixed } from './colours';
import type { Wanted } from './labels';
import type { Box, Mark, Place } from './marks';

/** The side of each rule that cannot be had, and the rules themselves over it. */
export function ruleMarks({ rules }: ChartData, frame: Frame, { colours }: Look): Mark[] {
  const shades = rules.map((rule): Mark => {
    const limit = rule.axis === 'x';
    return {
      kind: 'box',
      box: barredSide(rule, frame),
      fill: limit ? mixed(colours.card, colours.brassSoft, 0.75) : mixed(colours.card, colours.ground, 0.85),
      ...(limit ? { hatch: mixed(colours.card, colours.brass, 0.16) } : {}),
    };
  });
  const lines = rules.map((rule): Mark => {
    const [from, to] = ruleLine(rule, frame);
    const line = { kind: 'line', from, to, stroke: colours.text } as const;
    return rule.dashed ? { ...line, width: 2, dash: [3, 3] } : { ...line, width: 1.5 };
  });
  return [...shades, ...lines];
}

export function ruleLine({ axis, at }: ChartRule, { plot, x, y }: Frame): [from: Place, to: Place] {
  if (axis === 'x') {
    return [
      [x(at), plot.y],
      [x(at), plot.y + plot.height],
    ];
  }
  return [
    [plot.x, y(at)],
    [plot.x + plot.width, y(at)],
  ];
}

function barredSide({ axis, at, barred }: ChartRule, { plot, x, y }: Frame): Box {
  if (axis === 'x') {
    const edge = Math.min(Math.max(x(at), plot.x), plot.x + plot.width);
    return barred === 'above'
      ? { ...plot, x: edge, width: plot.x + plot.width - edge }
      : { ...plot, width: edge - plot.x };
  }
  const edge = Math.min(Math.max(y(at), plot.y), plot.y + plot.height);
  return barred === 'above'
    ? { ...plot, height: edge - plot.y }
    : { ...plot, y: edge, height: plot.y + plot.height - edge };
}

/** Where the rules' labels may stand: beside a vertical one from the top, above a horizontal one from either end. */
export function ruleLabels({ rules }: ChartData, { plot, x, y }: Frame, { measure }: Look): Wanted[] {
  const [right, bottom] = [plot.x + plot.width, plot.y + plot.height];
  return rules.flatMap(({ axis, at, label }): Wanted[] => {
    const width = measure(label, textSize, 400);
    const common = { key: `rule ${axis} ${at}`, text: label, width, height: textSize + 3 };
    if (axis === 'x') {
      const place = x(at);
      if (place > right) return [];
      const edge = Math.max(place, plot.x);
      const candidates = [0, 20, 40, 60].flatMap((step) => [
        { at: [edge + 8, plot.y + 12 + step] as const, align: 'start' as const },
        { at: [edge - 8, plot.y + 12 + step] as const, align: 'end' as const },
        { at: [edge + 8, bottom - 12 - step] as const, align: 'start' as const },
      ]);
      return [{ ...common, candidates }];
    }
    const place = y(at);
    if (place < plot.y || place > bottom) return [];
    const candidates = [-10, 11].flatMap((step) => [
      { at: [plot.x + 6, place + step] as const, align: 'start' as const },
      { at: [right - 6, place + step] as const, align: 'end' as const },
      { at: [plot.x + plot.width / 2, place + step] as const, align: 'middle' as const },
    ]);
    return [{ ...common, candidates }];
  });
}
