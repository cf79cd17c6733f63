/** One size of an option on the drawn axes. */
export interface ChartPoint {
  size: number;
  x: number;
  y: number;
}

export interface ChartSeries {
  id: string;
  letter: string;
  name: string;
  /** Place among the options: it gives hue and dash. */
  position: number;
  /** Ruled out: drawn as an outline. */
  outlined: boolean;
  emphasised: boolean;
  /** By rising size. */
  points: readonly ChartPoint[];
  /** Its size now. */
  now: ChartPoint | null;
  /** The largest size that keeps to the limits, and the limit that ends it; the curve is thin beyond. */
  end: { size: number; label: string } | null;
}

export interface ChartAxis {
  title: string;
  /** What the axis shows before it is zoomed. */
  domain: readonly [number, number];
  format: (value: number) => string;
  /** Ticks at whole numbers only. */
  whole: boolean;
}

/** A line across the picture: the hold, a limit, the target. */
export interface ChartRule {
  axis: 'x' | 'y';
  at: number;
  label: string;
  /** The side that cannot be had. */
  barred: 'above' | 'below';
  dashed: boolean;
}

/** Curves over two axes, with rules and the front: all that a picture of them needs to know. */
export interface ChartData {
  x: ChartAxis;
  y: ChartAxis;
  series: readonly ChartSeries[];
  rules: readonly ChartRule[];
  /** Stretches of the curves that nothing beats, each as places on the two axes. */
  front: readonly (readonly (readonly [x: number, y: number])[])[];
}

/** How far the picture is zoomed, and where to: as d3-zoom has it, measured from the plot's upper left corner. */
export interface View {
  k: number;
  x: number;
  y: number;
}

export const wholeView: View = { k: 1, x: 0, y: 0 };

/** What a picture looks like: the theme's colours, and how wide its text comes out. */
export interface Look {
  colours: {
    card: string;
    ground: string;
    line: string;
    edge: string;
    text: string;
    muted: string;
    brass: string;
    brassSoft: string;
    onHue: string;
    options: readonly string[];
  };
  font: string;
  measure(text: string, size: number, weight: number): number;
}
