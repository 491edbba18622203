import { signal } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { type ChargeRow } from '@shared/contracts/prices';
import { chargeFactory } from '../../../../test/factories/price-answer-factory';
import { Session } from '../../session/session';
import { ChargeSheet } from './charge-sheet';

const usd = (amount: string) => ({ amount, currency: 'USD' as const });
const charges: ChargeRow[] = [
  chargeFactory(),
  chargeFactory({ label: 'glass, lite 2' }),
  chargeFactory({ family: 'spacer', label: 'stainless steel spacer', basis: { quantity: '14.66666666666666666666666666666666666667', unit: 'ft' }, rate: '0.62', list: usd('9.09'), discountPercent: '0', discountReason: null, net: usd('9.09'), rule: 'northmere.3/spacers/stainless' }),
  chargeFactory({ family: 'size', label: 'non-standard size, 6 %', basis: { quantity: '176.81', unit: 'USD' }, rate: '0.06', list: usd('10.61'), discountPercent: '0', discountReason: null, net: usd('10.61'), rule: 'northmere.3/sizeCharges/nonStandard' }),
  chargeFactory({ family: 'quantity break', label: '5 or more, 3 %', basis: { quantity: '189.93', unit: 'USD' }, rate: '-0.03', list: usd('0.00'), discountPercent: '0', discountReason: null, net: usd('-5.70'), rule: 'northmere.3/quantityBreaks/5' }),
]; // prettier-ignore

let fixture: ComponentFixture<ChargeSheet>;
const text = (element: Element | null | undefined) => (element?.textContent ?? '').replace(/\s+/g, ' ').trim();
const host = () => fixture.nativeElement as HTMLElement;
const rows = () => [...host().querySelectorAll('tbody tr:not(.why)')];
const cells = (row: Element) => [...row.querySelectorAll('td')].map(text);

async function open(index: number): Promise<string> {
  rows()[index]!.querySelector('button')!.click();
  await fixture.whenStable();
  return text(rows()[index]!.nextElementSibling);
}

describe('ChargeSheet', () => {
  beforeEach(async () => {
    const user = signal({ company: { locale: 'en-US', timeZone: 'America/New_York' } });
    TestBed.configureTestingModule({ providers: [{ provide: Session, useValue: { user } }] });
    fixture = TestBed.createComponent(ChargeSheet);
    fixture.componentRef.setInput('line', { charges, unitPrice: usd('184.23'), linePrice: usd('1105.38') });
    fixture.componentRef.setInput('quantity', 6);
    fixture.componentRef.setInput('priceList', { name: 'Northmere trade list, version 3', effectiveFrom: '2026-09-01T04:00:00Z' });
    await fixture.whenStable();
  });

  it('shows list, what comes off and what is paid, row by row, and the sums', () => {
    expect(rows().map((row) => text(row.querySelector('th')))).toEqual([
      'Glass, lite 1',
      'Glass, lite 2',
      'Stainless steel spacer',
      'Non-standard size, 6 %',
      '5 or more, 3 %',
    ]);
    expect(cells(rows()[0]!)).toEqual(['27.71', '12 %', '24.38']);
    expect(cells(rows()[2]!)).toEqual(['9.09', '', '9.09']);
    expect(cells(rows()[4]!)).toEqual(['', '', '−5.70']);
    expect([...host().querySelectorAll('tfoot tr')].map(text)).toEqual(['One unit 184.23', '6 units 1,105.38']);
  });

  it('opens a row to basis × rate, the rounding, the discount and the rule with its list', async () => {
    expect(await open(0)).toBe(
      '13.1944 ft² at $2.10 per ft² make $27.708333, rounded to $27.71. ' +
        'Less 12 % for tier B: $24.3848, rounded to $24.38. ' +
        'Rule northmere.3/glass/clear-3 of Northmere trade list, version 3, in force from September 1, 2026.',
    );
    expect(rows()[0]!.querySelector('button')!.getAttribute('aria-expanded')).toBe('true');
  });

  it('explains percentages by the amount they are of', async () => {
    expect(await open(3)).toContain('6 % of $176.81, the charges by area at list, is $10.6086, rounded to $10.61. Nothing comes off');
    expect(await open(4)).toContain(
      '3 % of $189.93, the net price so far, is $5.6979, rounded to $5.70, taken off. Rule northmere.3/quantityBreaks/5',
    );
  });

  it('says nothing of a rounding where there was none', async () => {
    const exactly = chargeFactory({ basis: { quantity: '2', unit: 'tube' }, rate: '3.25', list: usd('6.50'), discountPercent: '0', discountReason: null, net: usd('6.50'), rule: 'northmere.3/extras/capillary-tube' }); // prettier-ignore
    fixture.componentRef.setInput('line', { charges: [exactly], unitPrice: usd('6.50'), linePrice: usd('39.00') });
    await fixture.whenStable();
    expect(await open(0)).toContain('2 tube at $3.25 per tube make $6.50. Nothing');
  });

  it('keeps a row open while its figures change', async () => {
    await open(0);
    const dearer = [chargeFactory({ list: usd('30.00'), net: usd('26.40') }), ...charges.slice(1)];
    fixture.componentRef.setInput('line', { charges: dearer, unitPrice: usd('186.25'), linePrice: usd('1117.50') });
    await fixture.whenStable();
    expect(host().querySelectorAll('.why')).toHaveLength(1);
  });

  it('shows no figure at all while it is stale', async () => {
    await open(0);
    fixture.componentRef.setInput('stale', true);
    await fixture.whenStable();
    expect(text(host().querySelector('tbody'))).not.toMatch(/\d\.\d\d/);
    expect(text(host().querySelector('tfoot'))).not.toMatch(/\d\.\d\d/);
    expect(host().querySelector('table')!.getAttribute('aria-busy')).toBe('true');
  });

  it('has no column for discounts where there are none', async () => {
    const plain = chargeFactory({ discountPercent: '0', discountReason: null, net: usd('27.71') });
    fixture.componentRef.setInput('line', { charges: [plain], unitPrice: usd('27.71'), linePrice: usd('27.71') });
    fixture.componentRef.setInput('quantity', 1);
    await fixture.whenStable();
    expect([...host().querySelectorAll('thead th')].map(text)).toEqual(['for each unit', 'list', 'yours']);
    expect([...host().querySelectorAll('tfoot tr')].map(text)).toEqual(['One unit 27.71']);
  });
});
