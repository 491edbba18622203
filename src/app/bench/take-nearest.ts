import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { changeWords } from './change-words';
import { findWay } from './find-way';
import { UnitDraft } from './unit-draft';

/** A button that changes the unit to the nearest that a maker can build, where there is one. */
@Component({
  selector: 'app-take-nearest',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (way(); as nearest) {
      <button type="button" class="quiet" (click)="draft.take(nearest)">Take {{ words() }}</button>
    }
  `,
  styleUrl: './quiet.scss',
})
export class TakeNearest {
  /** identity of the maker */
  readonly maker = input.required<string>();
  protected readonly draft = inject(UnitDraft);
  protected readonly way = computed(() => findWay(this.draft.shown(), this.maker(), this.draft.catalogue(), this.draft.system()));
  protected readonly words = computed(() => {
    const way = this.way();
    return way ? changeWords(this.draft.shown(), way, this.draft.catalogue(), this.draft.system()) : '';
  });
}
