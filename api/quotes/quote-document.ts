import { money } from '@shared/money/money';
import { type Dependencies } from '../dependencies';
import { type Party, type QuoteDocument, type UnitLine } from '../documents/document-models';
import { type QuoteLineRow, type QuoteRow } from './quote-store';
import { retailUnitMinor } from './retail';

/**
 * A quote as its document says it, in the dealer's name. Retail is for the dealer's customer and
 * holds nothing of the fabricator's prices; wholesale is for the dealer alone and holds nothing of
 * the mark-up.
 */
export function quoteDocument(
  quote: QuoteRow,
  prices: 'wholesale' | 'retail',
  { stores, catalogue }: Pick<Dependencies, 'stores' | 'catalogue'>,
): QuoteDocument {
  const dealer = stores.companies.company(quote.dealerId);
  if (!dealer) throw new Error(`no company ${quote.dealerId}`);
  const { fabricatorName, createdByName } = stores.quotes.namesOf(quote.id);
  const { lines: letterLines, email, phone } = dealer.letterhead;
  const head = {
    sender: { name: dealer.name, lines: letterLines, email, phone },
    number: quote.number,
    at: quote.updatedAt,
    locale: dealer.locale,
    timeZone: dealer.timeZone,
    measureSystem: dealer.measureSystem,
    validUntil: quote.validUntil,
    preparedBy: createdByName,
    customer: quote.customer && { name: quote.customer.name, lines: linesOf(quote.customer.address ?? '') },
    notes: quote.notes,
    catalogue: catalogue(),
  };
  const rows = stores.quotes.linesOf(quote.id);
  if (prices === 'retail') {
    const lines = rows.map((row) => unitLine(row, quote, retailUnitMinor(row.unitPriceMinor, quote.markUpPercent)));
    const totalMinor = lines.reduce((sum, line) => sum + line.lineMinor, 0);
    return { ...head, prices, lines: lines.map(({ line }) => line), total: money(totalMinor, quote.currency) };
  }
  return {
    ...head,
    prices,
    fabricator: fabricatorName,
    priceList: stores.priceLists.version(quote.priceListVersionId).name,
    leadTimeDays: quote.leadTimeDays,
    shipTo: shipToOf(quote, stores),
    lines: rows.map((row) => ({ ...unitLine(row, quote, row.unitPriceMinor).line, charges: row.sheet.charges })),
    totals: quote.totals,
  };
}

function unitLine(row: QuoteLineRow, { currency }: QuoteRow, unitMinor: number): { line: UnitLine; lineMinor: number } {
  const { position, tag, unit, makeUp, quantity } = row;
  const lineMinor = unitMinor * quantity;
  return {
    line: { position, tag, unit, makeUp, quantity, unitPrice: money(unitMinor, currency), linePrice: money(lineMinor, currency) },
    lineMinor,
  };
}

function shipToOf({ dealerId, shipToId }: QuoteRow, { companies }: Pick<Dependencies['stores'], 'companies'>): Party | null {
  const address = shipToId === null ? companies.firstAddressOf(dealerId) : companies.addressOf(dealerId, shipToId);
  if (!address) return null;
  const { label, lines, town, region, postcode, country } = address;
  return { name: label, lines: [...lines, `${town}, ${region} ${postcode}`, country] };
}

const linesOf = (text: string): string[] =>
  text
    .split(/\r?\n/)
    .map((line) => line.trim())
    .filter((line) => line !== '');
