import { type Catalogue } from '@shared/contracts/catalogue';
import { type Unit } from '@shared/contracts/units';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { findImpossibilities } from '@shared/glazing/find-impossibilities';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { applyReason, type Buildable } from './apply-reason';

/** One change can bring up another reason, as when a spacer comes in other widths; more rounds than this lead nowhere. */
const ROUNDS = 4;

/**
 * The nearest unit that a maker can build: every reason's nearest value, and again those of what
 * comes of it. For readers in inches, a size that changes goes to the sixteenth within the limit.
 * Null when the maker can build the unit as it is, or when this leads to none that it can.
 */
export function findWay(unit: Unit, maker: string, catalogue: Catalogue, system: MeasureSystem): Buildable | null {
  let now = unit;
  for (let round = 0; round < ROUNDS; round += 1) {
    if (findImpossibilities(now, catalogue).length > 0) return null;
    const reasons = evaluateUnit(now, catalogue).buildability.find(({ fabricator }) => fabricator.id === maker)?.reasons ?? [];
    if (reasons.length === 0) return round === 0 ? null : now;
    const before = now;
    for (const reason of reasons) now = { ...now, ...applyReason(now, reason) };
    if (system === 'imperial') {
      now = { ...now, width: toSixteenth(now.width, before.width), height: toSixteenth(now.height, before.height) };
    }
    if (JSON.stringify(now) === JSON.stringify(before)) return null;
  }
  return null;
}

/** A bound in mm as whole sixteenths of an inch within it, as seen from a length that was beyond. */
function toSixteenth(mm: string, from: string): string {
  if (mm === from) return mm;
  const parts = Number(mm) / 1.5875;
  const whole = Number(mm) < Number(from) ? Math.floor(parts + 1e-9) : Math.ceil(parts - 1e-9);
  return (whole * 1.5875).toFixed(4).replace(/\.?0+$/, '');
}
