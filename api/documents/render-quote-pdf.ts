import { writeChargeSheets } from './charge-sheets';
import { type Fact, writeHead } from './document-head';
import { type QuoteDocument, type WholesaleQuote } from './document-models';
import { createDraughtsman } from './draw-on-paper';
import { type Formats, formats } from './formats';
import { writeCaution, writeNote } from './notes';
import { createPaper } from './paper';
import { writeOrderTotals, writeTotals } from './totals';
import { writeUnitTable } from './unit-table';

/**
 * A quote under the dealer's own letterhead. The retail one is for the dealer's customer and is
 * made from a model that holds nothing of the fabricator's; the wholesale one ends with the
 * charge sheets.
 */
export async function renderQuotePdf(quote: QuoteDocument): Promise<Uint8Array> {
  const { sender, number, at, measureSystem, catalogue, customer, lines } = quote;
  const format = formats(quote);
  const paper = createPaper({ measureSystem, title: `Quote ${number}`, author: sender.name, at, foot: `Quote ${number}, ${sender.name}` });
  writeHead(paper, {
    sender,
    title: 'Quote',
    number,
    parties: [
      ...(customer ? [{ heading: 'For', party: customer }] : []),
      ...(quote.prices === 'wholesale' && quote.shipTo ? [{ heading: 'Ship to', party: quote.shipTo }] : []),
    ],
    facts: [
      ['Date', format.dayOf(at)],
      ['Valid until', format.day(quote.validUntil)],
      ['Prepared by', quote.preparedBy],
      ...(quote.prices === 'wholesale' ? makerFacts(quote) : []),
    ],
  });
  const currency = (quote.prices === 'retail' ? quote.total : quote.totals.total).currency;
  await writeUnitTable(paper, createDraughtsman(paper), lines, { catalogue, measureSystem, format, currency });
  if (quote.prices === 'retail') {
    writeTotals(paper, [[unitsText(quote, format), '']], ['Total', format.money(quote.total)]);
    writeNote(
      paper,
      'What the price covers',
      'The units as described. Tax, delivery and fitting are not included unless the notes say so.',
    );
  } else {
    writeOrderTotals(paper, quote.totals, format, 'Total');
  }
  if (quote.notes !== '') writeNote(paper, 'Notes', quote.notes);
  writeCaution(paper);
  if (quote.prices === 'wholesale') await writeChargeSheets(paper, quote.lines, format);
  return paper.finish();
}

const makerFacts = ({ fabricator, priceList, leadTimeDays }: WholesaleQuote): Fact[] => [
  ['Maker', fabricator],
  ['Price list', priceList],
  ...(leadTimeDays === null ? [] : [['Ready in', `${leadTimeDays} working days`] satisfies Fact]),
];

function unitsText({ lines }: QuoteDocument, format: Formats): string {
  const units = lines.reduce((sum, { quantity }) => sum + quantity, 0);
  return units === 1 ? 'One unit' : `${format.number(String(units), 0)} units`;
}
