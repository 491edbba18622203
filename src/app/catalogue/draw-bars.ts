import { type Drawing, type Item, round } from '@shared/drawings/drawing';

/** One bar: its length is `value`, `text` is how the value reads. */
export interface Bar {
  name: string;
  value: number;
  text: string;
  chosen: boolean;
}

const sheet = { width: 440, text: 14, row: 34 };
const left = 134;
const right = 370;

/** Values as level bars from zero, in the order given. */
export function drawBars(title: string, bars: readonly Bar[]): Drawing {
  const most = Math.max(...bars.map(({ value }) => value));
  return {
    width: sheet.width,
    height: bars.length * sheet.row + 4,
    title,
    description: bars.map(({ name, text }) => `${name}: ${text}.`).join(' '),
    items: bars.flatMap(({ name, value, text, chosen }, i): Item[] => {
      const y = i * sheet.row + 6;
      const width = round(((right - left) * value) / most);
      const middle = y + 16;
      return [
        { kind: 'text', x: left - 12, y: middle, text: name, size: sheet.text, anchor: 'end', role: 'ink', bold: chosen },
        { kind: 'rect', x: left, y, width, height: 22, fill: chosen ? 'copper' : 'glass', stroke: chosen ? 'copper' : 'glass-edge' },
        { kind: 'text', x: left + width + 8, y: middle, text, size: sheet.text, anchor: 'start', role: 'ink' },
      ];
    }),
  };
}
