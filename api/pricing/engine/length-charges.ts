import { addRow, chargeByPerimeter, refuse, type UnitInHand, wholeQuotient } from './unit-in-hand';
import { type Rule } from './compile-list';
import { decimalText, wholeMinor } from './charge';

/** The charges by length: spacers, grids and edge work. */

/** One row a cavity, on the billed perimeter. */
export function chargeSpacer(hand: UnitInHand): void {
  const { unit, list } = hand;
  const only = unit.cavities.length === 1;
  unit.cavities.forEach(({ spacer }, i) => {
    const rule = list.spacers.get(spacer);
    if (rule) addPerimeterCharge(hand, rule, only ? 0 : i + 1);
    else refuse(hand, `${list.products.nameOf('spacers', spacer)} spacer`, `/cavities/${i}/spacer`);
  });
}

/** The length of all bars, upright ones as long as the billed height, level ones as the billed width; and each crossing. */
export function chargeGrid(hand: UnitInHand): void {
  const { unit, list, width, height } = hand;
  if (!unit.grid || unit.grid.across + unit.grid.down === 0) return;
  const { bar, across, down } = unit.grid;
  const rules = list.grids.get(bar);
  if (!rules) return refuse(hand, list.products.nameOf('grids', bar), '/grid/bar');
  const { incrementSize, lengthDivisor, lengthParts, lengthUnit } = list.measures;
  const parts = incrementSize.times(across * height.steps + down * width.steps);
  const bars = wholeQuotient(parts.times(rules.bars.factor), lengthDivisor);
  addGridCharge(hand, rules.bars, bars, decimalText(parts.dividedBy(lengthParts)), lengthUnit);
  const crossings = across * down;
  if (crossings > 0)
    addGridCharge(hand, rules.crossings, wholeMinor(rules.crossings.factor.times(crossings)), String(crossings), 'crossing');
}

/** One row a lite whose edges are worked. */
export function chargeEdgeWork(hand: UnitInHand): void {
  const { unit, list } = hand;
  unit.lites.forEach(({ edgeWork }, i) => {
    if (edgeWork === undefined) return;
    const rule = list.edgeWork.get(edgeWork);
    if (rule) addPerimeterCharge(hand, rule, i + 1);
    else refuse(hand, `${list.products.nameOf('edgeWork', edgeWork)} edges`, `/lites/${i}/edgeWork`);
  });
}

function addPerimeterCharge(hand: UnitInHand, rule: Rule, place: number): void {
  if (!rule.free) chargeByPerimeter(hand, rule, place);
}

function addGridCharge(hand: UnitInHand, rule: Rule, listMinor: number, quantity: string, unit: string): void {
  if (!rule.free) addRow(hand, 'grid', rule.labels[0] ?? '', quantity, unit, rule.rate, listMinor, rule.id);
}
