import { Exact } from '@shared/money/exact';
import { decimalText, wholeMinor } from './charge';
import { type ExtraRule } from './compile-list';
import { addRow, refuse, type UnitInHand } from './unit-in-hand';

/**
 * Extras in the order of the list: those of open capillary tubes, those on everything, and those
 * asked for, each once. A charge per line is shared by the units of the line, so that a line stays
 * unit price × quantity: each unit's share is rounded like any charge.
 */
export function chargeExtras(hand: UnitInHand): void {
  const { unit, list, extras } = hand;
  const tubes = unit.cavities.filter(({ capillary }) => capillary).length;
  let tubeRated = false;
  for (const rule of list.extras) {
    if (rule.applies === 'capillary') {
      if (tubes === 0) continue;
      tubeRated = true;
      addExtra(hand, rule, tubes, 'tube');
    } else if (rule.applies === 'always' || extras.includes(rule.extra)) {
      addExtra(hand, rule, unit.cavities.length, 'cavity');
    }
  }
  if (tubes > 0 && !tubeRated) {
    refuse(hand, 'an open capillary tube', `/cavities/${unit.cavities.findIndex(({ capillary }) => capillary)}/capillary`);
  }
  for (const [i, asked] of extras.entries()) {
    if (!list.extras.some((rule) => rule.applies === 'asked' && rule.extra === asked)) refuse(hand, `the extra “${asked}”`, `/extras/${i}`);
  }
}

/** `counted` and `what` it counts where the extra is per cavity. */
function addExtra(hand: UnitInHand, rule: ExtraRule, counted: number, what: string): void {
  if (rule.free) return;
  const [times, unit] = rule.per === 'cavity' ? [new Exact(counted), what] : rule.per === 'unit' ? [new Exact(1), 'unit'] : [null, 'line'];
  const listMinor = wholeMinor(times ? rule.factor.times(times) : rule.factor.dividedBy(hand.quantity));
  const quantity = decimalText(times ?? new Exact(1).dividedBy(hand.quantity));
  addRow(hand, 'extras', rule.labels[0] ?? '', quantity, unit, rule.rate, listMinor, rule.id);
}
