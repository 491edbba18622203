import { type Catalogue } from '@shared/contracts/catalogue';
import { type FieldError, Refusal } from '@shared/contracts/problems';
import { type Unit } from '@shared/contracts/units';
import { findImpossibilities } from '@shared/glazing/find-impossibilities';

/**
 * Refuses units that cannot exist, whoever would make them.
 *
 * @param units each with the JSON pointer of the field it came in
 * @throws Refusal `invalid`, every fault at its field
 */
export function demandPossible(units: readonly { unit: Unit; pointer: string }[], catalogue: Catalogue): void {
  const faults: FieldError[] = units.flatMap(({ unit, pointer }) =>
    findImpossibilities(unit, catalogue).map((fault) => ({ pointer: `${pointer}${fault.pointer}`, detail: fault.detail })),
  );
  const [first] = faults;
  if (!first) return;
  throw new Refusal(
    'invalid',
    faults.length === 1 ? `${first.pointer}: ${first.detail}` : `${faults.length} fields cannot be used.`,
    faults,
  );
}
