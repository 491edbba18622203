import { type Totals } from '@shared/contracts/prices';
import { type Formats } from './formats';
import { type Paper } from './paper';

const plain = { size: 9.5 };
const strong = { size: 11, weight: 700 as const };
const ROW = 14;

/** Rows of totals at the right; `sum` is the last and set apart. */
export function writeTotals(paper: Paper, rows: readonly [label: string, figure: string][], sum: [label: string, figure: string]): void {
  const left = paper.left + paper.width * 0.5;
  const room = paper.right - left - 90;
  const wrapped = rows.map(([label, figure]) => ({ lines: paper.type.wrap(label, room, plain), figure }));
  paper.demand(wrapped.reduce((height, { lines }) => height + Math.max(ROW, paper.type.height(lines.length, plain)), 0) + 32);
  paper.y += 4;
  for (const { lines, figure } of wrapped) {
    paper.type.write([figure], paper.right, paper.y, plain, 'end');
    const below = paper.type.write(lines, left, paper.y, plain);
    paper.y = Math.max(below, paper.y + ROW);
  }
  paper.rule(paper.y + 1, 'ink', left, paper.right, 0.8);
  paper.y += 6;
  paper.type.write([sum[0]], left, paper.y, strong);
  paper.type.write([sum[1]], paper.right, paper.y, strong, 'end');
  paper.y += 22;
}

/** Goods, each order charge and each tax as rows, with the total. */
export function writeOrderTotals(paper: Paper, { goods, orderCharges, tax, total }: Totals, format: Formats, label: string): void {
  writeTotals(
    paper,
    [
      ['Goods', format.amount(goods)],
      ...orderCharges.map(({ label: name, net }): [string, string] => [name, format.amount(net)]),
      ...tax.map(({ label: name, rate, base, amount }): [string, string] => [
        `${name}, ${format.number(rate, 4)} % on ${format.amount(base)}`,
        format.amount(amount),
      ]),
    ],
    [label, format.money(total)],
  );
}
