import type { Palette } from '../../shared/ui/palette';

export const lightPalette: Palette = {
  ground: '#f7f6f2',
  card: '#ffffff',
  line: '#e2dfd6',
  edge: '#867f70',
  text: '#1c2531',
  muted: '#4f5967',
  bar: '#15253c',
  brass: '#8a5c1a',
  brassSoft: '#f3ead9',
  fits: '#1e6f42',
  over: '#9a3d00',
  options: ['#255ed0', '#933310', '#147161', '#451b6a', '#52142c', '#627293'],
  onHue: '#ffffff',
  hovered: '#faf9f5',
  chosen: '#fcf8ef',
};

export const darkPalette: Palette = {
  ground: '#101a29',
  card: '#182436',
  line: '#2a384e',
  edge: '#8593a8',
  text: '#e8edf4',
  muted: '#a9b4c3',
  bar: '#0b1320',
  brass: '#d9b26a',
  brassSoft: '#2b2616',
  fits: '#67c78f',
  over: '#f2a268',
  options: ['#7fb2ee', '#f08a5d', '#4cc3b2', '#b99af0', '#f08cb8', '#aab6c6'],
  onHue: '#101a29',
  hovered: '#1c293d',
  chosen: '#222b33',
};
