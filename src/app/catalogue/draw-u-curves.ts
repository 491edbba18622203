import { type Drawing, type Item, round } from '@shared/drawings/drawing';
import { decimals } from './facts';

/** U-value against cavity width for one fill. */
export interface UCurve {
  name: string;
  points: readonly { widthMm: number; u: number }[];
  /** drawn before the others */
  chosen: boolean;
}

const sheet = { width: 440, height: 280, text: 13 };
const frame = { left: 44, right: 366, top: 34, bottom: 242 };

/** U-values against cavity width, one line for each fill, its lowest point marked. */
export function drawUCurves(curves: readonly UCurve[]): Drawing {
  const points = curves.flatMap((curve) => curve.points);
  const widths = points.map(({ widthMm }) => widthMm);
  const [from, to] = [Math.min(...widths), Math.max(...widths)];
  const lowest = Math.floor(Math.min(...points.map(({ u }) => u)) * 5 - 0.5) / 5;
  const highest = Math.ceil(Math.max(...points.map(({ u }) => u)) * 5) / 5;
  const x = (mm: number) => round(frame.left + ((mm - from) / (to - from)) * (frame.right - frame.left));
  const y = (u: number) => round(frame.bottom - ((u - lowest) / (highest - lowest)) * (frame.bottom - frame.top));
  const write = (
    text: string,
    at: { x: number; y: number },
    anchor: 'start' | 'middle' | 'end',
    role: 'ink' | 'soft' = 'soft',
    bold = false,
  ): Item => {
    return { kind: 'text', ...at, text, size: sheet.text, anchor, role, bold };
  };

  const levels = Array.from({ length: Math.round((highest - lowest) / 0.2) + 1 }, (_, i) => lowest + 0.2 * i);
  const ticks = Array.from({ length: Math.floor((to - from) / 2) + 1 }, (_, i) => from + 2 * i);
  const names = spreadNames(curves.map(({ points: own }) => y(own.at(-1)?.u ?? lowest)));
  const ordered = curves.map((curve, i) => ({ ...curve, nameY: names[i]! })).sort((a, b) => Number(a.chosen) - Number(b.chosen));
  return {
    width: sheet.width,
    height: sheet.height,
    title: 'U-value against cavity width',
    description: curves.map(describe).join(' '),
    items: [
      write('U-value, W/m²K', { x: 4, y: 14 }, 'start'),
      ...levels.flatMap((u): Item[] => [
        { kind: 'line', x1: frame.left, y1: y(u), x2: frame.right, y2: y(u), stroke: 'line' },
        write(decimals(u, 1), { x: frame.left - 8, y: y(u) + 4 }, 'end'),
      ]),
      ...ticks.map((mm) => write(`${mm}`, { x: x(mm), y: frame.bottom + 20 }, 'middle')),
      write('mm', { x: frame.right + 14, y: frame.bottom + 20 }, 'start'),
      ...ordered.flatMap(({ name, points: own, chosen, nameY }): Item[] => {
        const best = lowestOf(own);
        const role = chosen ? 'copper' : 'glass-edge';
        const d = own.map(({ widthMm, u }, i) => `${i === 0 ? 'M' : 'L'}${x(widthMm)} ${y(u)}`).join('');
        return [
          { kind: 'path', d, stroke: role, weight: chosen ? 3 : 2 },
          { kind: 'circle', cx: x(best.widthMm), cy: y(best.u), r: chosen ? 5 : 4, fill: role },
          write(name, { x: frame.right + 10, y: nameY + 4 }, 'start', chosen ? 'ink' : 'soft', chosen),
        ];
      }),
    ],
  };
}

function describe({ name, points }: UCurve): string {
  const best = lowestOf(points);
  const first = points[0]!;
  const last = points.at(-1)!;
  const at = ({ widthMm, u }: { widthMm: number; u: number }) => `${decimals(u, 2)} at ${widthMm} mm`;
  return `With ${name}: ${at(first)}, lowest ${at(best)}, ${at(last)}.`;
}

function lowestOf(points: UCurve['points']): { widthMm: number; u: number } {
  return points.reduce((best, each) => (each.u < best.u ? each : best));
}

/** Moves names apart that would stand on each other, in the order of the lines. */
function spreadNames(wanted: readonly number[]): number[] {
  const order = wanted.map((y, i) => ({ y, i })).sort((a, b) => a.y - b.y);
  for (let i = 1; i < order.length; i++) order[i]!.y = Math.max(order[i]!.y, order[i - 1]!.y + sheet.text * 1.3);
  const placed: number[] = [];
  for (const { y, i } of order) placed[i] = y;
  return placed;
}
