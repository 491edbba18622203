import { computed, inject, Injectable } from '@angular/core';
import { type Reason } from '@shared/contracts/evaluation';
import { UnitDraft } from './unit-draft';

/** The maker that comes nearest, and what of one field it refuses. */
export interface NobodyNote {
  maker: { id: string; name: string };
  detail: string;
}

/**
 * Why nobody can build the unit, by the field that causes it: the reasons of the maker that comes
 * nearest. Empty as long as anybody can.
 */
@Injectable()
export class NobodyBuilds {
  private readonly draft = inject(UnitDraft);
  readonly nearest = computed(() => {
    const { buildability } = this.draft.evaluation();
    if (buildability.length === 0 || this.draft.behind() || buildability.some(({ canBuild }) => canBuild)) return null;
    return buildability.reduce((best, maker) => (maker.reasons.length < best.reasons.length ? maker : best));
  });

  /** @param pointer into the unit; fields below it count too */
  at(pointer: string): NobodyNote | null {
    const nearest = this.nearest();
    const reasons = nearest?.reasons.filter((reason) => reason.pointer === pointer || reason.pointer.startsWith(`${pointer}/`)) ?? [];
    const reason = reasons.find(decides) ?? reasons[0];
    return nearest && reason ? { maker: nearest.fabricator, detail: reason.detail } : null;
  }
}

/** Of several limits along one edge, the one that the nearest value comes from. */
function decides({ limit, nearestValue }: Reason): boolean {
  return nearestValue !== null && limit.split(' ')[0] === nearestValue;
}
