import { type Drawing, type Item, round } from '@shared/drawings/drawing';
import { dewPoint } from '@shared/glazing/condensation';
import { decimals, percentText } from './facts';

const sheet = { width: 440, height: 280, text: 13 };
const frame = { left: 52, right: 424, top: 34, bottom: 242 };
const most = 0.6;
const [coldest, warmest] = [-40, 15];

/**
 * Dew point of the air in a cavity against its humidity (told at 20 °C), and the coldest face it
 * meets: above the crossing it fogs.
 *
 * @param face temperature of that face, °C
 * @param fogsFrom humidity at which the dew point reaches it, 0 to 1
 */
export function drawDewPoint(face: number, fogsFrom: number): Drawing {
  const x = (humidity: number) => round(frame.left + (humidity / most) * (frame.right - frame.left));
  const y = (celsius: number) => round(frame.bottom - ((celsius - coldest) / (warmest - coldest)) * (frame.bottom - frame.top));
  const write = (
    text: string,
    at: { x: number; y: number },
    anchor: 'start' | 'middle' | 'end',
    role: 'ink' | 'soft' = 'soft',
    bold = false,
  ): Item => {
    return { kind: 'text', ...at, text, size: sheet.text, anchor, role, bold };
  };
  const curve = Array.from({ length: 120 }, (_, i) => ((i + 1) / 120) * most).filter((humidity) => dewPoint(20, humidity) >= coldest);
  const levels = [-40, -30, -20, -10, 0, 10];
  return {
    width: sheet.width,
    height: sheet.height,
    title: 'When the cavity fogs',
    description: `Dew point of the cavity's air against its humidity at 20 °C: ${[0.05, 0.1, 0.2, 0.4].map((h) => `${percentText(h)} gives ${decimals(dewPoint(20, h), 0)} °C`).join(', ')}. The coldest face is at ${decimals(face, 1)} °C, so that it fogs from ${percentText(fogsFrom)} up.`,
    items: [
      {
        kind: 'rect',
        x: x(fogsFrom),
        y: frame.top,
        width: round(frame.right - x(fogsFrom)),
        height: frame.bottom - frame.top,
        fill: 'tint',
      },
      write('dew point, °C', { x: 4, y: 14 }, 'start'),
      ...levels.flatMap((celsius): Item[] => [
        { kind: 'line', x1: frame.left, y1: y(celsius), x2: frame.right, y2: y(celsius), stroke: 'line' },
        write(decimals(celsius, 0), { x: frame.left - 8, y: y(celsius) + 4 }, 'end'),
      ]),
      ...[0, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6].map((humidity) =>
        write(percentText(humidity), { x: x(humidity), y: frame.bottom + 20 }, 'middle'),
      ),
      { kind: 'line', x1: frame.left, y1: y(face), x2: frame.right, y2: y(face), stroke: 'ink', dash: [5, 4] },
      write(`coldest face, ${decimals(face, 1)} °C`, { x: frame.right - 6, y: y(face) + 18 }, 'end', 'ink'),
      {
        kind: 'path',
        d: curve.map((humidity, i) => `${i === 0 ? 'M' : 'L'}${x(humidity)} ${y(dewPoint(20, humidity))}`).join(''),
        stroke: 'copper',
        weight: 3,
      },
      { kind: 'circle', cx: x(fogsFrom), cy: y(face), r: 5, fill: 'copper' },
      write(`fogs from ${percentText(fogsFrom)}`, { x: x(fogsFrom) + 12, y: frame.top + 18 }, 'start', 'ink', true),
    ],
  };
}
