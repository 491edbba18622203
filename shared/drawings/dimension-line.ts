import { type Item, round } from './drawing';

/** Half the length of the bar and the slant that end a dimension line, in text sizes. */
const bar = 0.36;
const slant = 0.22;

/**
 * A level dimension line with its text above the middle. The line starts and ends exactly at
 * what it measures.
 */
export function levelDimension(x1: number, x2: number, y: number, text: string, size: number): Item[] {
  const ends = [x1, x2].map((x) => `M${round(x)} ${round(y - bar * size)}v${round(2 * bar * size)}${tick(x, y, size)}`).join('');
  return [
    { kind: 'path', d: `M${round(x1)} ${round(y)}H${round(x2)}${ends}`, stroke: 'soft', weight: 0.8, part: 'dimension line' },
    { kind: 'text', x: round((x1 + x2) / 2), y: round(y - 0.5 * size), text, size, anchor: 'middle', role: 'ink', part: 'dimension' },
  ];
}

/** An upright dimension line; its text reads upward, on the line's left or right. */
export function uprightDimension(x: number, y1: number, y2: number, text: string, size: number, side: 'left' | 'right'): Item[] {
  const ends = [y1, y2].map((y) => `M${round(x - bar * size)} ${round(y)}h${round(2 * bar * size)}${tick(x, y, size)}`).join('');
  const baseline = side === 'left' ? x - 0.5 * size : x + 1.25 * size;
  return [
    { kind: 'path', d: `M${round(x)} ${round(y1)}V${round(y2)}${ends}`, stroke: 'soft', weight: 0.8, part: 'dimension line' },
    {
      kind: 'text',
      x: round(baseline),
      y: round((y1 + y2) / 2),
      text,
      size,
      anchor: 'middle',
      role: 'ink',
      upward: true,
      part: 'dimension',
    },
  ];
}

const tick = (x: number, y: number, size: number) =>
  `M${round(x - slant * size)} ${round(y + slant * size)}l${round(2 * slant * size)} ${round(-2 * slant * size)}`;
