import { scatter, trace } from './picture';

/** How glass breaks, as one path within a square from (x, y) with sides of `size`. */

interface Square {
  x: number;
  y: number;
  size: number;
}

const cut = ({ x, y, size }: Square, px: number, py: number): [number, number] => [
  Math.max(x, Math.min(x + size, px)),
  Math.max(y, Math.min(y + size, py)),
];

/** Cracks from one point to the edge with few between them: long sharp shards, or the larger islands of strengthened glass. */
export function crackStar(square: Square, rays: number, rings: number): string {
  const cx = square.x + square.size * 0.42;
  const cy = square.y + square.size * 0.4;
  const ends = Array.from({ length: rays }, (_, i) => {
    const angle = ((i + 0.7 * scatter(i, 3)) * 2 * Math.PI) / rays;
    return { cos: Math.cos(angle), sin: Math.sin(angle) };
  });
  const lines = ends.map(({ cos, sin }, i) => {
    const bend = 0.2 * (scatter(i, 5) - 0.5);
    const middle = cut(square, cx + square.size * 0.3 * (cos - bend * sin), cy + square.size * 0.3 * (sin + bend * cos));
    return trace('M', cx, cy, 'L', ...middle, 'L', ...cut(square, cx + square.size * cos, cy + square.size * sin));
  });
  const circles = Array.from({ length: rings }, (_, ring) => {
    const points = ends.map(({ cos, sin }, i) => {
      const r = square.size * (0.14 + 0.2 * ring) * (0.8 + 0.5 * scatter(i, ring + 11));
      return trace(i === 0 ? 'M' : 'L', ...cut(square, cx + r * cos, cy + r * sin));
    });
    return `${points.join('')}Z`;
  });
  return [...lines, ...circles].join('');
}

/** A net of small blunt pieces. */
export function dice(square: Square, across: number): string {
  const step = square.size / across;
  const corner = (i: number, j: number): [number, number] => {
    const edge = (k: number) => k === 0 || k === across;
    return [
      square.x + step * (i + (edge(i) ? 0 : 0.7 * (scatter(i, j) - 0.5))),
      square.y + step * (j + (edge(j) ? 0 : 0.7 * (scatter(j + 17, i) - 0.5))),
    ];
  };
  const lines: string[] = [];
  for (let i = 0; i <= across; i++) {
    for (let j = 0; j <= across; j++) {
      if (i < across && j > 0 && j < across) lines.push(trace('M', ...corner(i, j), 'L', ...corner(i + 1, j)));
      if (j < across && i > 0 && i < across) lines.push(trace('M', ...corner(i, j), 'L', ...corner(i, j + 1)));
    }
  }
  return lines.join('');
}
