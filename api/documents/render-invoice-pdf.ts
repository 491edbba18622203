import { writeHead } from './document-head';
import { type InvoiceDocument } from './document-models';
import { minorOf, money, type Money } from '@shared/money/money';
import { type Formats, formats } from './formats';
import { createPaper, type Paper } from './paper';
import { paperColors } from './paper-colors';
import { type Column, endTable, startTable, writeRow } from './table';
import { writeOrderTotals } from './totals';

const small = { size: 8, role: 'soft' as const };
const plain = { size: 9.5 };
const strong = { size: 9.5, weight: 700 as const };

/** An invoice under the fabricator's letterhead, with everything needed to pay it. */
export async function renderInvoicePdf(invoice: InvoiceDocument): Promise<Uint8Array> {
  const { sender, number, at, measureSystem, lines, totals } = invoice;
  const format = formats(invoice);
  const paper = createPaper({
    measureSystem,
    title: `Invoice ${number}`,
    author: sender.name,
    at,
    foot: `Invoice ${number}, ${sender.name}`,
  });
  writeHead(paper, {
    sender,
    title: 'Invoice',
    number,
    parties: [
      { heading: 'To', party: invoice.dealer },
      { heading: 'Shipped to', party: invoice.shipTo },
    ],
    facts: [
      ['Date', format.day(invoice.issuedOn)],
      ['Due', format.day(invoice.dueOn)],
      ['Terms', invoice.terms],
      ['Order', invoice.orderNumber],
      ['Your PO', invoice.poNumber],
      ['Dispatch', invoice.dispatchNumber],
    ],
  });
  const [position, quantity, each, total] = [24, 50, 70, 76];
  const tag = paper.width * 0.2;
  const columns: Column[] = [
    { head: '', width: position, align: 'start' },
    { head: 'Tag', width: tag, align: 'start' },
    { head: 'Unit', width: paper.width - position - tag - quantity - each - total, align: 'start' },
    { head: 'Quantity', width: quantity, align: 'end' },
    { head: 'Each', width: each, align: 'end' },
    { head: totals.total.currency, width: total, align: 'end' },
  ];
  startTable(paper, columns);
  for (const line of lines) {
    writeRow(
      paper,
      columns,
      [
        String(line.position),
        line.tag ?? '',
        line.description,
        format.number(String(line.quantity), 0),
        format.amount(line.unitPrice),
        format.amount(line.linePrice),
      ],
      { size: 9 },
      3,
    );
    paper.rule(paper.y - 1);
    paper.y += 3;
  }
  endTable(paper);
  writeOrderTotals(paper, totals, format, 'Total to pay');
  writePayment(paper, invoice, format);
  return paper.finish();
}

/** The box with reference, days and bank. */
function writePayment(paper: Paper, { reference, dueOn, discount, bankDetails, totals }: InvoiceDocument, format: Formats): void {
  const { type, doc } = paper;
  const rows: [name: string, value: string][] = [
    ['Reference', (reference.match(/.{1,4}/g) ?? []).join(' ')],
    ['Pay by', `${format.day(dueOn)}: ${format.money(totals.total)}`],
    ...(discount ? [['Or by', discountText(totals.total, discount, format)] as [string, string]] : []),
    ...bankDetails.map((line, i): [string, string] => [i === 0 ? 'To' : '', line]),
  ];
  const nameRoom = 64;
  const wrapped = rows.map(([name, value], i) => ({
    name,
    lines: type.wrap(value, paper.width - nameRoom - 32, i === 0 ? strong : plain),
  }));
  const height = wrapped.reduce((sum, { lines }) => sum + type.height(lines.length, plain) + 2, 0) + 20;
  paper.demand(height);
  doc.roundedRect(paper.left, paper.y, paper.width, height, 5).lineWidth(0.8).strokeColor(paperColors.copper).stroke();
  let y = paper.y + 10;
  for (const [i, { name, lines }] of wrapped.entries()) {
    type.writeLine(name, paper.left + 14, y + 9.4, small);
    y = type.write(lines, paper.left + 14 + nameRoom, y, i === 0 ? strong : plain) + 2;
  }
  paper.y += height + 12;
}

function discountText(total: Money, { percent, until, amount }: NonNullable<InvoiceDocument['discount']>, format: Formats): string {
  const { currency } = total;
  const less = money(minorOf(total.amount, currency) - minorOf(amount.amount, currency), currency);
  return `${format.day(until)}: ${format.money(less)}, which is ${format.number(percent, 4)} % (${format.money(amount)}) less`;
}
