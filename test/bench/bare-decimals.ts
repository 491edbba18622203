import { Exact } from '@shared/money/exact';

/**
 * The worked example priced by decimal arithmetic alone, every constant prepared: the operations no
 * exact pricing can do without. Each distinct amount is made once (both lites share theirs), the
 * rates and sizes are those of this one unit, and there are no look-ups, rows, labels or reasons.
 *
 * @param width mm, as height a decimal string; the weight in kg likewise
 * @returns unit price in cents
 */
export function bareDecimals(width: string, height: string, weight: string): number {
  const wide = new Exact(width);
  const high = new Exact(height);
  const [widthSteps, heightSteps] = [steps(wide), steps(high)];
  const product = four.times(widthSteps * heightSteps);
  const area = product.lessThan(least) ? least : product;
  const perimeter = two.times(2 * (widthSteps + heightSteps));
  const areaText = area.dividedBy(parts).toDecimalPlaces(20).toString();
  const perimeterText = perimeter.dividedBy(twelve).toDecimalPlaces(20).toString();

  const glass = byArea(area, rates.glass);
  const tempering = byArea(area, rates.tempering);
  const coating = byArea(area, rates.coating);
  const assembly = byArea(area, rates.assembly);
  const gas = byArea(area, rates.gas);
  const spacer = perimeter.times(rates.spacer).plus(six).dividedToIntegerBy(twelve).toNumber();
  const areaCharges = 2 * glass + 2 * tempering + coating + assembly + gas;
  const net =
    2 * part(glass, keeps12) + 2 * part(tempering, keeps12) + part(coating, keeps12) + part(assembly, keeps12) + part(gas, keeps5);

  const united = wide.plus(high);
  const oversize = united.greaterThan(over130) ? part24 : united.greaterThan(over100) ? part15 : united.greaterThan(over80) ? part8 : null;
  const sum = net + spacer + part(areaCharges, part6) + (oversize ? part(areaCharges, oversize) : 0);
  if (new Exact(weight).greaterThan(over150) || sum === 0) return 0;
  // The texts stand on the sheet; using them here keeps the compiler from leaving them out.
  if (areaText.length + perimeterText.length === 0) return 0;
  return sum - part(sum, part3);
}

const two = new Exact(2);
const four = new Exact(4);
const increment = new Exact('50.8');
const increments = { top: new Exact(508), bottom: new Exact(10) };
const least = new Exact(432);
const parts = new Exact(144);
const half = new Exact(72);
const six = new Exact(6);
const twelve = new Exact(12);
const rates = {
  glass: new Exact(210),
  tempering: new Exact(195),
  coating: new Exact(135),
  assembly: new Exact(340),
  gas: new Exact(55),
  spacer: new Exact(62),
};
const keeps12 = new Exact('0.88');
const keeps5 = new Exact('0.95');
const part3 = new Exact('0.03');
const part6 = new Exact('0.06');
const part8 = new Exact('0.08');
const part15 = new Exact('0.15');
const part24 = new Exact('0.24');
const over80 = new Exact('2032');
const over100 = new Exact('2540');
const over130 = new Exact('3302');
const over150 = new Exact('68.0388555');

function steps(side: Exact): number {
  const whole = side.times(increments.bottom).dividedToIntegerBy(increments.top);
  const count = whole.toNumber();
  return whole.times(increment).lessThan(side) ? count + 1 : count;
}

function byArea(area: Exact, rate: Exact): number {
  return area.times(rate).plus(half).dividedToIntegerBy(parts).toNumber();
}

function part(minor: number, of: Exact): number {
  return of.times(minor).round().toNumber();
}
