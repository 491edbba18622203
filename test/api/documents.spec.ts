import { renderAcknowledgementPdf } from '@api/documents/render-acknowledgement-pdf';
import { renderInvoicePdf } from '@api/documents/render-invoice-pdf';
import { renderQuotePdf } from '@api/documents/render-quote-pdf';
import { unitFactory } from '../factories/catalogue-factory';
import {
  acknowledgementFactory,
  invoiceFactory,
  retailQuoteFactory,
  unitLines,
  wholesaleQuoteFactory,
} from '../factories/document-factory';
import { pdfPages } from '../factories/pdf-text';

const textOf = async (pdf: Promise<Uint8Array>) =>
  pdfPages(await pdf)
    .flat()
    .join('\n');

describe('documents', () => {
  it.each([
    ['retail quote', () => renderQuotePdf(retailQuoteFactory())],
    ['wholesale quote', () => renderQuotePdf(wholesaleQuoteFactory())],
    ['acknowledgement', () => renderAcknowledgementPdf(acknowledgementFactory())],
    ['invoice', () => renderInvoicePdf(invoiceFactory())],
  ])('prints a %s again to the byte', async (_name, render) => {
    const first = await render();
    expect(Buffer.from(first.subarray(0, 5)).toString()).toBe('%PDF-');
    await new Promise((resolve) => setTimeout(resolve, 1100));
    expect(Buffer.compare(Buffer.from(first), Buffer.from(await render()))).toBe(0);
  });

  it('puts tag, size in both measures, make-up, details, both drawings and prices on a quote', async () => {
    const text = await textOf(renderQuotePdf(wholesaleQuoteFactory()));
    for (const expected of [
      'Ottery Glass & Sash',
      'OG-1042',
      'R. Penhallow',
      'October 15, 2026',
      '1  Bay, left',
      '36 1/2 × 48 1/4 in',
      '927.1 × 1225.55 mm',
      'spacer: stainless steel',
      'open capillary tube',
      'edges ground',
      // the elevation's and the section's own texts
      '48 1/4 in',
      '0.86 in',
      'secondary seal',
      '184.23',
      '1,105.38',
      'Delivery, local zone',
      'Ohio sales tax, 5.75 % on 3,361.14',
      '$3,554.41',
      'Northmere Sealed Units',
      'Northmere trade list of 1 September',
      'Charge sheets',
      'Clear 3 mm, 2 lites (tier B)',
    ]) {
      expect(text).toContain(expected);
    }
    expect(text.replaceAll('\n', ' ')).toContain('3 temp / 16 argon / 3 temp low-e 3');
    // Not a whole number of sixteenths: said to be rounded.
    expect(text).toContain('about 70 7/8 × 27 9/16 in');
  });

  it('shows a customer nothing of the fabricator’s, even where a caller hands it over', async () => {
    const { fabricator, priceList, leadTimeDays, totals, lines } = wholesaleQuoteFactory();
    const charges = lines[0]!.charges;
    const retail = retailQuoteFactory();
    const careless = { ...retail, fabricator, priceList, leadTimeDays, totals, lines: retail.lines.map((line) => ({ ...line, charges })) };
    const text = await textOf(renderQuotePdf(careless));
    expect(text).toContain('1,492.26');
    expect(text).toContain('$4,476.78');
    expect(text).not.toMatch(/Northmere|184\.23|1,105\.38|3,554\.41|tier|Charge sheets|working days|Price list/);
  });

  it('says on each document with drawings that it does not certify', async () => {
    for (const pdf of [renderQuotePdf(retailQuoteFactory()), renderAcknowledgementPdf(acknowledgementFactory())]) {
      expect((await textOf(pdf)).replaceAll('\n', ' ')).toContain('local codes and a licensed professional decide');
    }
  });

  it('puts what is needed to pay on an invoice', async () => {
    const text = await textOf(renderInvoicePdf(invoiceFactory()));
    for (const expected of [
      'NM-24-1187',
      'September 25, 2026',
      'October 25, 2026',
      '2 % 10 net 30',
      'PO 5518',
      'NM-D-3310',
      'RF35 NM24 1187',
      'October 25, 2026: $3,554.41',
      'October 5, 2026: $3,483.32, which is 2 % ($71.09) less',
      'Lakeside Trade Bank',
    ]) {
      expect(text).toContain(expected);
    }
  });

  it('speaks of no discount where there is none, nor of days nobody named', async () => {
    expect(await textOf(renderInvoicePdf(invoiceFactory({ discount: null })))).not.toContain('Or by');
    const text = await textOf(renderAcknowledgementPdf(acknowledgementFactory({ requiredOn: null, promisedOn: null })));
    expect(text).not.toMatch(/Asked for by|Ready by/);
  });

  it('writes money and days in the locale of the sender', async () => {
    const text = await textOf(renderInvoicePdf(invoiceFactory({ locale: 'de-DE' })));
    expect(text).toContain('1.105,38');
    expect(text).toMatch(/3\.554,41\s\$/);
    expect(text).toContain('25. September 2026');
  });

  it('dates an order by the sender’s day, not by Greenwich’s', async () => {
    const late = acknowledgementFactory({ at: Date.UTC(2026, 8, 16, 2) });
    expect(await textOf(renderAcknowledgementPdf(late))).toContain('September 15, 2026');
    expect(await textOf(renderAcknowledgementPdf({ ...late, timeZone: 'Europe/Copenhagen' }))).toContain('September 16, 2026');
  });

  it('prints 200 lines with the head of the table and a number on every page', async () => {
    const pages = pdfPages(await renderAcknowledgementPdf(acknowledgementFactory({ lines: unitLines(200) })));
    expect(pages.length).toBeGreaterThan(30);
    for (const [i, page] of pages.entries()) {
      expect(page).toContain(`page ${i + 1} of ${pages.length}`);
      if (page.includes('secondary seal')) expect(page).toContain('Unit, width × height');
    }
    const numbered = pages.flat().filter((text) => /^\d+( {2}|$)/.test(text) && Number.parseInt(text) > 6);
    expect(new Set(numbered.map((text) => Number.parseInt(text))).size).toBe(194);
  }, 60_000);

  it('keeps long names whole, in lines that fit', async () => {
    const name = `${'Zażółć gęślą jaźń '.repeat(8)}${'W'.repeat(90)}`;
    const pages = pdfPages(await renderInvoicePdf(invoiceFactory({ dealer: { name, lines: [] } })));
    const set = pages[0]!.join('').replaceAll(/\s/g, '');
    expect(set).toContain('Zażółćgęśląjaźń'.repeat(8));
    expect(set.split('W').length - 1).toBeGreaterThanOrEqual(90);
    expect(Math.max(...pages[0]!.map((text) => text.length))).toBeLessThan(90);
  });

  it('breaks no line within a measure', async () => {
    const line = invoiceFactory().lines[0]!;
    const lines = Array.from({ length: 12 }, (_, i) => ({
      ...line,
      description: `${'low-e '.repeat(i)}36 1/2 × 48 1/4 in or 900 mm, 2 % more`,
    }));
    const texts = pdfPages(await renderInvoicePdf(invoiceFactory({ lines }))).flat();
    for (const part of ['36 1/2', '48 1/4 in', '900 mm', '2 %']) {
      expect({ part, whole: texts.filter((text) => text.includes(part)).length }).toEqual({ part, whole: part === '2 %' ? 14 : 12 });
    }
  });

  it('writes what the font lacks without its accent, or as a question mark, never as nothing', async () => {
    const text = await textOf(renderInvoicePdf(invoiceFactory({ poNumber: 'PO 硝 ⅛ Kůň' })));
    expect(text).toContain('PO ? 1⁄8 Kun');
  });

  it('writes a line whose products have left the catalogue without its section', async () => {
    const [line] = unitLines(1);
    const gone = {
      ...line!,
      unit: unitFactory({ cavities: [{ width: '16', gas: 'gone', spacer: 'stainless' }] }),
      makeUp: '3 / 16 gone / 3',
    };
    const text = await textOf(renderAcknowledgementPdf(acknowledgementFactory({ lines: [gone] })));
    expect(text).toContain('3 / 16 gone / 3');
    expect(text).not.toContain('secondary seal');
  });

  it('writes currencies without cents as they are', async () => {
    const yen = { amount: '1105', currency: 'JPY' as const };
    const lines = [{ position: 1, tag: null, description: 'unit', quantity: 1, unitPrice: yen, linePrice: yen }];
    const totals = { goods: yen, orderCharges: [], tax: [], total: yen };
    expect(await textOf(renderInvoicePdf(invoiceFactory({ lines, totals, discount: null })))).toContain('¥1,105');
  });
});
