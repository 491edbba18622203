import { type Item, round } from './drawing';
import { spreadApart } from './spread-apart';
import { wrapText } from './text-width';

export interface Label {
  /** where its leader starts */
  x: number;
  y: number;
  text: string;
}

/** The column that labels stand in: leaders bend at `bend`, text starts at `left`. */
export interface LabelColumn {
  bend: number;
  left: number;
  width: number;
  top: number;
  bottom: number;
  size: number;
}

const leading = 1.12;
const gap = 0.2;

/**
 * Labels in one column, each with a leader from what it names; none touches another, and leaders
 * do not cross. Where a unit has more to name than there is room, all of them are written smaller.
 */
export function placeLabels(labels: readonly Label[], { bend, left, width, top, bottom, size: wantedSize }: LabelColumn): Item[] {
  const wrap = (size: number) => labels.map((label) => ({ ...label, lines: wrapText(label.text, size, width, 2) }));
  const sizesOf = (lines: readonly string[]) => lines.length * leading + gap;
  const needed = wrap(wantedSize).reduce((sum, { lines }) => sum + sizesOf(lines), 0) * wantedSize;
  const size = round(wantedSize * Math.min(1, (bottom - top) / needed));
  const wrapped = wrap(size);
  const middles = spreadApart(
    wrapped.map(({ y, lines }) => ({ wanted: y, size: sizesOf(lines) * size })),
    top,
    bottom,
  );
  return wrapped.flatMap(({ x, y, lines }, i): Item[] => {
    const middle = middles[i]!;
    const first = middle - ((lines.length - 1) * leading * size) / 2 + 0.35 * size;
    return [
      { kind: 'circle', cx: round(x), cy: round(y), r: round(0.11 * size), fill: 'ink', part: 'leader' },
      {
        kind: 'path',
        d: `M${round(x)} ${round(y)}H${round(bend)}L${round(left - 0.25 * size)} ${round(middle)}`,
        stroke: 'soft',
        weight: 0.7,
        part: 'leader',
      },
      ...lines.map((line, row): Item => {
        return {
          kind: 'text',
          x: round(left),
          y: round(first + row * leading * size),
          text: line,
          size,
          anchor: 'start',
          role: 'ink',
          part: 'label',
        };
      }),
    ];
  });
}
