import { levelDimension, uprightDimension } from '@shared/drawings/dimension-line';
import { type Drawing, type Item, type Role } from '@shared/drawings/drawing';

/** Drawings that show how to measure. Clearances are drawn larger than they are. */

const text = 14;

const write = (words: string, x: number, y: number, anchor: 'start' | 'middle' | 'end' = 'middle', role: Role = 'soft'): Item => {
  return { kind: 'text', x, y, text: words, size: text, anchor, role };
};
const line = (x1: number, y1: number, x2: number, y2: number, stroke: Role, dash?: [number, number]): Item => {
  return { kind: 'line', x1, y1, x2, y2, stroke, weight: stroke === 'copper' ? 2 : 1, ...(dash ? { dash } : {}) };
};

/** A frame with a unit in it, seen from outside: what is deducted, and where the setting blocks stand. */
export function drawOpening(): Drawing {
  const opening = { x: 90, y: 66, width: 260, height: 210 };
  const gap = 14;
  const unit = { x: opening.x + gap, y: opening.y + gap, width: opening.width - 2 * gap, height: opening.height - 2 * gap };
  const [left, right] = [unit.x, unit.x + unit.width];
  const bottom = opening.y + opening.height;
  const block = (at: number): Item => {
    return { kind: 'rect', x: unit.x + unit.width * at - 18, y: unit.y + unit.height, width: 36, height: gap, fill: 'butyl' };
  };
  return {
    width: 440,
    height: 350,
    title: 'A unit in its opening',
    description:
      'Seen from outside, clearances drawn larger than they are. The opening is 36 3/4 in wide; the unit is 36 1/2 in wide, 1/8 in smaller at each side. It stands on two setting blocks at the quarter points of its bottom edge.',
    items: [
      {
        kind: 'rect',
        x: opening.x - 26,
        y: opening.y - 26,
        width: opening.width + 52,
        height: opening.height + 52,
        fill: 'tint',
        stroke: 'line',
      },
      { kind: 'rect', ...opening, fill: 'sheet', stroke: 'ink' },
      { kind: 'rect', ...unit, fill: 'glass', stroke: 'ink', weight: 1.4 },
      { kind: 'rect', x: unit.x + 7, y: unit.y + 7, width: unit.width - 14, height: unit.height - 14, stroke: 'metal', weight: 2 },
      block(0.25),
      block(0.75),
      ...levelDimension(opening.x, opening.x + opening.width, 26, 'opening 36 3/4', text),
      ...levelDimension(left, right, unit.y + unit.height / 2 + 8, 'unit 36 1/2', text),
      line(right + gap / 2, unit.y + 50, 392, unit.y + 30, 'soft'),
      write('1/8', 397, unit.y + 34, 'start', 'ink'),
      line(unit.x + unit.width * 0.75, bottom - 4, unit.x + unit.width * 0.75, bottom + 44, 'soft'),
      line(unit.x + unit.width * 0.25, bottom - 4, unit.x + unit.width * 0.25, bottom + 44, 'soft'),
      write('setting blocks', opening.x + opening.width / 2, bottom + 58, 'middle', 'ink'),
      line(unit.x + unit.width * 0.25, bottom + 44, unit.x + unit.width * 0.75, bottom + 44, 'soft'),
    ],
  };
}

/** An opening measured in three places each way, and across. */
export function drawThreePlaces(): Drawing {
  const box = { x: 66, y: 40, width: 260, height: 240 };
  const at = [0.08, 0.5, 0.92];
  const [right, bottom] = [box.x + box.width, box.y + box.height];
  return {
    width: 400,
    height: 330,
    title: 'Three widths, three heights, two diagonals',
    description:
      'An opening with three level and three upright lines of measure, near the ends and in the middle, and both diagonals dashed.',
    items: [
      { kind: 'rect', x: box.x - 22, y: box.y - 22, width: box.width + 44, height: box.height + 44, fill: 'tint', stroke: 'line' },
      { kind: 'rect', ...box, fill: 'sheet', stroke: 'ink' },
      line(box.x, box.y, right, bottom, 'copper', [7, 4]),
      line(right, box.y, box.x, bottom, 'copper', [7, 4]),
      ...at.flatMap((share) => {
        const y = box.y + share * box.height;
        const x = box.x + share * box.width;
        return [line(box.x, y, right, y, 'glass-edge'), line(x, box.y, x, bottom, 'glass-edge')];
      }),
      ...at.map((share, i) => write(`w${i + 1}`, right + 30, box.y + share * box.height + 5, 'start', 'ink')),
      ...at.map((share, i) => write(`h${i + 1}`, box.x + share * box.width, bottom + 42, 'middle', 'ink')),
    ],
  };
}

/** An inch of a rule: what was measured lies between two marks, and goes down to the lower one. */
export function drawRoundingDown(): Drawing {
  const rule = { x: 30, y: 92, inch: 400, height: 62 };
  const ticks = Array.from({ length: 17 }, (_, i): Item => {
    const x = rule.x + (i / 16) * rule.inch;
    const long = i % 16 === 0 ? 40 : i % 8 === 0 ? 32 : i % 4 === 0 ? 24 : i % 2 === 0 ? 17 : 11;
    return line(x, rule.y, x, rule.y + long, i === 8 ? 'copper' : 'ink');
  });
  const found = rule.x + 0.53 * rule.inch;
  const kept = rule.x + 0.5 * rule.inch;
  return {
    width: 460,
    height: 172,
    title: 'Rounded down to a sixteenth',
    description:
      'One inch of a rule from 36 to 37, in sixteenths. A measure of 36.53 in lies between 36 1/2 and 36 9/16; the unit is ordered 36 1/2 in.',
    items: [
      { kind: 'rect', x: rule.x - 16, y: rule.y, width: rule.inch + 32, height: rule.height, fill: 'tint', stroke: 'line' },
      ...ticks,
      write('36', rule.x, rule.y + 56),
      write('37', rule.x + rule.inch, rule.y + 56),
      line(found, 46, found, rule.y, 'ink', [4, 3]),
      write('measured 36.53', found + 6, 42, 'start', 'ink'),
      {
        kind: 'path',
        d: `M${kept} 62V${rule.y - 4}M${kept - 5} ${rule.y - 10}L${kept} ${rule.y - 3}L${kept + 5} ${rule.y - 10}`,
        stroke: 'copper',
        weight: 2,
      },
      { kind: 'text', x: kept - 6, y: 68, text: 'ordered 36 1/2', size: text, anchor: 'end', role: 'ink', bold: true },
    ],
  };
}

/** The bottom edge of a unit in its rebate, from the side. */
export function drawRebate(): Drawing {
  const glass = { left: 128, width: 20, gap: 62, bottom: 262, top: 24 };
  const inner = glass.left + glass.width;
  const second = inner + glass.gap;
  const right = second + glass.width;
  const rebate = { top: 196, floor: 286 };
  const call = (words: string, x: number, y: number): Item[] => [
    line(x, y, right + 66, y, 'soft'),
    write(words, right + 72, y + 5, 'start', 'ink'),
  ];
  return {
    width: 440,
    height: 340,
    title: 'The bottom edge in its rebate',
    description:
      'A section from the side. The unit stands on a setting block in the rebate of the frame. The bite is how deep the edge sits in the rebate; the edge clearance is what is left below; the sightline is the depth of spacer and seals.',
    items: [
      {
        kind: 'path',
        d: `M70 ${rebate.top}H112V${rebate.floor}H${right + 16}V${rebate.top}H${right + 58}V326H70Z`,
        fill: 'tint',
        stroke: 'soft',
      },
      {
        kind: 'rect',
        x: glass.left - 4,
        y: glass.bottom,
        width: right - glass.left + 8,
        height: rebate.floor - glass.bottom,
        fill: 'butyl',
      },
      { kind: 'rect', x: inner, y: 216, width: glass.gap, height: glass.bottom - 216, fill: { hatch: 'secondary seal' } },
      { kind: 'rect', x: inner + 4, y: 190, width: glass.gap - 8, height: 34, fill: { hatch: 'desiccant' }, stroke: 'metal', weight: 3 },
      { kind: 'rect', x: inner, y: 194, width: 4, height: 28, fill: 'butyl' },
      { kind: 'rect', x: second - 4, y: 194, width: 4, height: 28, fill: 'butyl' },
      {
        kind: 'rect',
        x: glass.left,
        y: glass.top,
        width: glass.width,
        height: glass.bottom - glass.top,
        fill: 'glass',
        stroke: 'ink',
        weight: 1.2,
      },
      {
        kind: 'rect',
        x: second,
        y: glass.top,
        width: glass.width,
        height: glass.bottom - glass.top,
        fill: 'glass',
        stroke: 'ink',
        weight: 1.2,
      },
      ...uprightDimension(98, rebate.top, glass.bottom, 'bite', text, 'left'),
      ...uprightDimension(56, glass.bottom, rebate.floor, 'clearance', text, 'left'),
      line(56, glass.bottom, glass.left, glass.bottom, 'line'),
      line(56, rebate.floor, 112, rebate.floor, 'line'),
      write('outside', 62, 60, 'middle'),
      ...call('sightline from here', second - 6, 190),
      ...call('frame', right + 40, 240),
      ...call('setting block', right, 274),
    ],
  };
}
