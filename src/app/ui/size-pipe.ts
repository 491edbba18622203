import { inject, Pipe, type PipeTransform } from '@angular/core';
import { formatLength, formatLengthNumber, otherMeasure } from '@shared/measures/format-length';
import { Session } from '../session/session';

/** A size, width before height, in the company's measures: `36 1/2 × 48 1/4 in`; `other` gives it in the other ones. */
@Pipe({ name: 'size' })
export class SizePipe implements PipeTransform {
  private readonly session = inject(Session);

  transform({ width, height }: { width: string; height: string }, measures: 'own' | 'other' = 'own'): string {
    const own = this.session.user()?.company.measureSystem ?? 'metric';
    const system = measures === 'own' ? own : otherMeasure(own);
    return `${formatLengthNumber(width, system)} × ${formatLength(height, system).replace(/^≈ /, '')}`;
  }
}
