import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { findWay } from './find-way';
import { takesWords } from './reason-words';
import { UnitDraft } from './unit-draft';

/** A button that changes the unit to the nearest that a maker can build, where there is one. */
@Component({
  selector: 'app-take-nearest',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (way(); as found) {
      <button type="button" class="quiet" (click)="draft.take(found.unit)">Take {{ words() }}</button>
    }
  `,
  styleUrl: './quiet.scss',
})
export class TakeNearest {
  /** identity of the maker */
  readonly maker = input.required<string>();
  protected readonly draft = inject(UnitDraft);
  protected readonly way = computed(() => findWay(this.draft.shown(), this.maker(), this.draft.catalogue()));
  protected readonly words = computed(() => takesWords(this.way()?.met ?? [], this.draft.catalogue(), this.draft.system()));
}
