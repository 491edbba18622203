import { writeHead } from './document-head';
import { type AcknowledgementDocument } from './document-models';
import { createDraughtsman } from './draw-on-paper';
import { formats } from './formats';
import { writeCaution, writeNote } from './notes';
import { createPaper } from './paper';
import { writeOrderTotals } from './totals';
import { writeUnitTable } from './unit-table';

/** What a fabricator sends back for an order: what it will make, to what drawings, at what price and by when. */
export async function renderAcknowledgementPdf(order: AcknowledgementDocument): Promise<Uint8Array> {
  const { sender, number, at, measureSystem, catalogue, lines, totals } = order;
  const format = formats(order);
  const title = 'Order acknowledgement';
  const paper = createPaper({
    measureSystem,
    title: `${title} ${number}`,
    author: sender.name,
    at,
    foot: `${title} ${number}, ${sender.name}`,
  });
  writeHead(paper, {
    sender,
    title,
    number,
    parties: [
      { heading: 'For', party: order.dealer },
      { heading: 'Ship to', party: order.shipTo },
    ],
    facts: [
      ['Your PO', order.poNumber],
      ['Placed', format.dayOf(at)],
      ['Placed by', order.placedBy],
      ...(order.requiredOn ? [['Asked for by', format.day(order.requiredOn)] as [string, string]] : []),
      ...(order.promisedOn ? [['Ready by', format.day(order.promisedOn)] as [string, string]] : []),
      ['Terms', order.terms],
    ],
  });
  await writeUnitTable(paper, createDraughtsman(paper), lines, { catalogue, measureSystem, format, currency: totals.total.currency });
  writeOrderTotals(paper, totals, format, 'Total');
  writeNote(
    paper,
    'Please check',
    'Sizes, make-ups, shapes and quantities are made as written here. Tell us at once if anything differs from your order: once production starts it can no longer be changed.',
  );
  writeCaution(paper);
  return paper.finish();
}
