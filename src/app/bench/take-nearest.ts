import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { type Reason } from '@shared/contracts/evaluation';
import { takesWords } from './reason-words';
import { canApplyNearest } from './apply-nearest';
import { UnitDraft } from './unit-draft';

/** A button that changes the unit to the nearest that passes, where there is one. */
@Component({
  selector: 'app-take-nearest',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (words(); as nearest) {
      <button type="button" class="quiet" (click)="draft.take(reasons())">Take {{ nearest }}</button>
    }
  `,
  styleUrl: './quiet.scss',
})
export class TakeNearest {
  readonly reasons = input.required<readonly Reason[]>();
  protected readonly draft = inject(UnitDraft);
  protected readonly words = computed(() =>
    canApplyNearest(this.reasons()) ? takesWords(this.reasons(), this.draft.catalogue(), this.draft.system()) : '',
  );
}
