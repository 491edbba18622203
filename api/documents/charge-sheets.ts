import { setImmediate } from 'node:timers/promises';
import { type WholesaleQuote } from './document-models';
import { type Formats } from './formats';
import { type Paper } from './paper';
import { type Column, endTable, startTable, writeRow } from './table';

const strong = { size: 9.5, weight: 700 as const };
const plain = { size: 8.5 };

/** On pages of their own, what each line is made up of: for one unit, row by row. */
export async function writeChargeSheets(paper: Paper, lines: WholesaleQuote['lines'], format: Formats): Promise<void> {
  const figures = [84, 56, 56, 48, 60];
  const columns: Column[] = [
    { head: 'For each unit', width: paper.width - figures.reduce((sum, width) => sum + width, 0), align: 'start' },
    { head: 'Basis', width: figures[0]!, align: 'end' },
    { head: 'Rate', width: figures[1]!, align: 'end' },
    { head: 'List', width: figures[2]!, align: 'end' },
    { head: 'Off, %', width: figures[3]!, align: 'end' },
    { head: 'Yours', width: figures[4]!, align: 'end' },
  ];
  paper.newPage();
  paper.y = paper.type.write(['Charge sheets'], paper.left, paper.y, { size: 14 }) + 8;
  startTable(paper, columns);
  for (const { position, tag, unitPrice, charges } of lines) {
    // A heading never stands alone at the foot of a page.
    paper.demand(48);
    const [title = ''] = paper.type.wrap(tag ? `${position}  ${tag}` : String(position), paper.width - 90, strong);
    paper.type.write([title], paper.left, paper.y, strong);
    paper.type.write([format.amount(unitPrice)], paper.right, paper.y, strong, 'end');
    paper.y += 15;
    for (const { label, basis, rate, list, discountPercent, discountReason, net } of charges) {
      writeRow(
        paper,
        columns,
        [
          discountReason ? `${label} (${discountReason})` : label,
          `${format.number(basis.quantity, 3)} ${basis.unit}`,
          format.number(rate, 4),
          format.amount(list),
          /[1-9]/.test(discountPercent) ? format.number(discountPercent, 2) : '',
          format.amount(net),
        ],
        plain,
        1,
      );
    }
    paper.rule(paper.y + 2);
    paper.y += 8;
    await setImmediate();
  }
  endTable(paper);
}
