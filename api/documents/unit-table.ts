import { setImmediate } from 'node:timers/promises';
import { type Catalogue } from '@shared/contracts/catalogue';
import { elevation } from '@shared/drawings/elevation';
import { section } from '@shared/drawings/section';
import { resolveUnit } from '@shared/glazing/resolve-unit';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { type Draughtsman } from './draw-on-paper';
import { type UnitLine } from './document-models';
import { type Formats, sizeLines } from './formats';
import { type Paper } from './paper';
import { type Column, columnX, endTable, startTable } from './table';
import { unitDetails } from './unit-details';

const SCALE = 0.5;
const elevationSheet = { width: 204, height: 224, textSize: 14 };
const sectionSheet = { width: 256, height: 224, textSize: 14 };
const DRAWINGS = (elevationSheet.width + sectionSheet.width) * SCALE + 4;
const plain = { size: 9 };
const soft = { size: 8, role: 'soft' as const };
const strong = { size: 9.5, weight: 700 as const };

/** The lines of a document: tag, size in both measures, make-up and details, both drawings, and what it costs. */
export async function writeUnitTable(
  paper: Paper,
  draughtsman: Draughtsman,
  lines: readonly UnitLine[],
  { catalogue, measureSystem, format, currency }: { catalogue: Catalogue; measureSystem: MeasureSystem; format: Formats; currency: string },
): Promise<void> {
  const [quantity, price, total] = [34, 58, 64];
  const columns: Column[] = [
    { head: 'Unit, width × height', width: paper.width - DRAWINGS - quantity - price - total, align: 'start' },
    { head: 'Seen from outside, and cut through the edge', width: DRAWINGS, align: 'start' },
    { head: 'Quantity', width: quantity, align: 'end' },
    { head: 'Each', width: price, align: 'end' },
    { head: currency, width: total, align: 'end' },
  ];
  startTable(paper, columns);
  for (const line of lines) {
    writeUnit(line);
    // Others have their turn between lines: hundreds of them take seconds.
    await setImmediate();
  }
  endTable(paper);

  function writeUnit({ position, tag, unit, makeUp, quantity: count, unitPrice, linePrice }: UnitLine): void {
    const { type } = paper;
    const room = columns[0]!.width - 10;
    const [own, other] = sizeLines(unit, measureSystem);
    const texts = [
      { lines: type.wrap(tag ? `${position}  ${tag}` : String(position), room, strong), style: strong },
      { lines: type.wrap(own, room, plain), style: plain },
      { lines: type.wrap(other, room, soft), style: soft },
      { lines: type.wrap(makeUp, room, plain), style: plain },
      { lines: unitDetails(unit, catalogue, measureSystem).flatMap((detail) => type.wrap(detail, room, soft)), style: soft },
    ];
    const textHeight = texts.reduce((sum, { lines: rows, style }) => sum + type.height(rows.length, style) + 1.5, 0);
    const height = Math.max(textHeight, elevationSheet.height * SCALE) + 8;
    paper.demand(height);
    const top = paper.y;
    let y = top;
    for (const { lines: rows, style } of texts) y = type.write(rows, paper.left, y, style) + 1.5;
    drawUnit(columnX(columns, 1, paper.left), top, unit);
    const figures = [format.number(String(count), 0), format.amount(unitPrice), format.amount(linePrice)];
    for (const [i, figure] of figures.entries())
      type.write([figure], columnX(columns, i + 2, paper.left), top, i === 2 ? strong : plain, 'end');
    paper.y = top + height;
    paper.rule(paper.y - 3);
    paper.y += 4;
  }

  /** A line whose products have left the catalogue is written, not drawn. */
  function drawUnit(x: number, y: number, unit: UnitLine['unit']): void {
    draughtsman.draw(elevation(unit, catalogue, { system: measureSystem, sheet: elevationSheet }), x, y, SCALE);
    if ('problems' in resolveUnit(unit, catalogue)) return;
    draughtsman.draw(
      section(unit, catalogue, { system: measureSystem, sheet: sectionSheet }),
      x + elevationSheet.width * SCALE + 4,
      y,
      SCALE,
    );
  }
}
