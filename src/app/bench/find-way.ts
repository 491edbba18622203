import { type Catalogue } from '@shared/contracts/catalogue';
import { type Reason } from '@shared/contracts/evaluation';
import { type Unit } from '@shared/contracts/units';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { findImpossibilities } from '@shared/glazing/find-impossibilities';
import { applyReason, type Buildable } from './apply-reason';

/** A unit that a maker can build, near one that it cannot, and the reasons that were met on the way. */
export interface Way {
  unit: Buildable;
  met: Reason[];
}

/** One change can bring up another reason, as when a spacer comes in other widths; more rounds than this lead nowhere. */
const ROUNDS = 4;

/**
 * The nearest unit that a maker can build: every reason's nearest value, and again those of what
 * comes of it. Null when the maker can build it as it is, or when this leads to no unit it can.
 */
export function findWay(unit: Unit, maker: string, catalogue: Catalogue): Way | null {
  const met: Reason[] = [];
  let now = unit;
  for (let round = 0; round < ROUNDS; round += 1) {
    if (findImpossibilities(now, catalogue).length > 0) return null;
    const reasons = evaluateUnit(now, catalogue).buildability.find(({ fabricator }) => fabricator.id === maker)?.reasons ?? [];
    if (reasons.length === 0) return round === 0 ? null : { unit: now, met };
    let changed = false;
    for (const reason of reasons) {
      const next = applyReason(now, reason);
      if (!next) continue;
      now = { ...now, ...next };
      met.push(reason);
      changed = true;
    }
    if (!changed) return null;
  }
  return null;
}
