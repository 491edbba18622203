import { chargeByArea, refuse, type UnitInHand } from './unit-in-hand';
import { type Rule } from './compile-list';

/** The charges by area: glass, treatment, coating, assembly and gas. Percentages are taken on them. */

/** One row a lite. */
export function chargeGlass(hand: UnitInHand): void {
  const { unit, list } = hand;
  unit.lites.forEach(({ glass }, i) => {
    const rule = list.glass.get(glass);
    if (rule) addAreaCharge(hand, rule, i + 1);
    else refuse(hand, list.products.nameOf('glasses', glass), `/lites/${i}/glass`);
  });
}

/** One row a treated lite, by treatment and nominal thickness. Glass left annealed costs nothing unless the list says so. */
export function chargeTreatment(hand: UnitInHand): void {
  const { unit, list } = hand;
  unit.lites.forEach(({ glass, treatment }, i) => {
    const item = list.products.glasses.get(glass);
    const rule = item && list.treatments.get(treatment)?.get(item.nominalMm);
    if (rule) addAreaCharge(hand, rule, i + 1);
    else if (item && list.products.treatments.get(treatment)?.kind !== 'annealed') {
      refuse(hand, `${list.products.nameOf('treatments', treatment)} ${item.name}`, `/lites/${i}/treatment`);
    }
  });
}

/** One row a coated surface. */
export function chargeCoating(hand: UnitInHand): void {
  const { unit, list } = hand;
  unit.lites.forEach(({ coating }, i) => {
    if (!coating) return;
    const rule = list.coatings.get(coating.id);
    if (rule) addAreaCharge(hand, rule, coating.surface);
    else refuse(hand, list.products.nameOf('coatings', coating.id), `/lites/${i}/coating/id`);
  });
}

/** One row a cavity, at the rate of its number from outside. */
export function chargeAssembly(hand: UnitInHand): void {
  const { unit, list } = hand;
  const only = unit.cavities.length === 1;
  for (let number = 1; number <= unit.cavities.length; number += 1) {
    const rule = list.assembly.get(number);
    if (rule) addAreaCharge(hand, rule, only ? 0 : number);
    else refuse(hand, `cavity ${number}`, `/cavities/${number - 1}`);
  }
}

/** One row a cavity, not below the list's minimum for one cavity. */
export function chargeGas(hand: UnitInHand): void {
  const { unit, list } = hand;
  const only = unit.cavities.length === 1;
  unit.cavities.forEach(({ gas }, i) => {
    const rule = list.gases.get(gas);
    if (rule) addAreaCharge(hand, rule, only ? 0 : i + 1);
    else refuse(hand, list.products.nameOf('gases', gas), `/cavities/${i}/gas`);
  });
}

/** Adds a charge by area to those that percentages are taken on. */
function addAreaCharge(hand: UnitInHand, rule: Rule, place: number): void {
  if (!rule.free) hand.sheet.areaMinor += chargeByArea(hand, rule, place);
}
