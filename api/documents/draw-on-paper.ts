import { type Drawing, type Fill, type Hatch, hatches, type Item, type Tile } from '@shared/drawings/drawing';
import { paperColors } from './paper-colors';
import { type Paper } from './paper';

type Pattern = ReturnType<PDFKit.PDFDocument['pattern']>;

/** Draws drawings as vectors on one paper. `scale` is in points for a unit of the drawing. */
export function createDraughtsman({ doc, type }: Pick<Paper, 'doc' | 'type'>) {
  const patterns = new Map<Hatch, Pattern>();

  const patternOf = (hatch: Hatch): Pattern => {
    let pattern = patterns.get(hatch);
    if (!pattern) {
      const tile = hatches[hatch];
      pattern = doc.pattern([0, 0, tile.size, tile.size], tile.size, tile.size, tileOperators(tile));
      patterns.set(hatch, pattern);
    }
    return pattern;
  };

  const fillAndStroke = (item: Exclude<Item, { kind: 'text' }>, trace: () => void): void => {
    const fill: Fill | undefined = item.kind === 'line' ? undefined : item.fill;
    if (typeof fill === 'object') {
      const { ground, ink } = hatches[fill.hatch];
      trace();
      doc.fill(paperColors[ground]);
      trace();
      doc.fill([patternOf(fill.hatch), paperColors[ink]]);
    } else if (fill) {
      trace();
      doc.fill(paperColors[fill]);
    }
    if (!item.stroke) return;
    trace();
    doc.lineWidth(item.weight ?? 1).strokeColor(paperColors[item.stroke]);
    if (item.dash) doc.dash(item.dash[0], { space: item.dash[1] });
    doc.stroke();
    if (item.dash) doc.undash();
  };

  const drawItem = (item: Item): void => {
    switch (item.kind) {
      case 'path':
        return fillAndStroke(item, () => doc.path(item.d));
      case 'line':
        return fillAndStroke(item, () => doc.moveTo(item.x1, item.y1).lineTo(item.x2, item.y2));
      case 'rect':
        return fillAndStroke(item, () =>
          item.radius
            ? doc.roundedRect(item.x, item.y, item.width, item.height, item.radius)
            : doc.rect(item.x, item.y, item.width, item.height),
        );
      case 'circle':
        return fillAndStroke(item, () => doc.circle(item.cx, item.cy, item.r));
      case 'text': {
        const style = { size: item.size, role: item.role, weight: item.bold ? (700 as const) : (400 as const) };
        if (!item.upward) return type.writeLine(item.text, item.x, item.y, style, item.anchor);
        doc.save().rotate(-90, { origin: [item.x, item.y] });
        type.writeLine(item.text, item.x, item.y, style, item.anchor);
        doc.restore();
      }
    }
  };

  return {
    draw: ({ items }: Drawing, x: number, y: number, scale: number): void => {
      doc.save().translate(x, y).scale(scale);
      for (const item of items) drawItem(item);
      doc.restore();
    },
  };
}
export type Draughtsman = ReturnType<typeof createDraughtsman>;

/** A tile as the operators of a PDF pattern, without colour. */
function tileOperators({ dots, lines }: Tile): string {
  return [
    ...dots.map(({ cx, cy, r }) => {
      // A circle of four Bézier curves; the constant is 4/3·(√2 − 1).
      const k = r * 0.5523;
      const at = (...numbers: number[]) => numbers.map((number) => number.toFixed(3)).join(' ');
      return [
        `${at(cx - r, cy)} m`,
        `${at(cx - r, cy + k, cx - k, cy + r, cx, cy + r)} c`,
        `${at(cx + k, cy + r, cx + r, cy + k, cx + r, cy)} c`,
        `${at(cx + r, cy - k, cx + k, cy - r, cx, cy - r)} c`,
        `${at(cx - k, cy - r, cx - r, cy - k, cx - r, cy)} c f`,
      ].join(' ');
    }),
    ...lines.map(({ x1, y1, x2, y2, weight }) => `${weight} w ${x1} ${y1} m ${x2} ${y2} l S`),
  ].join('\n');
}
