import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MakerReasons } from './maker-reasons';
import { UnitDraft } from './unit-draft';

/** Who can build the unit and, of those who cannot, which rule stands against it and what would do. */
@Component({
  selector: 'app-maker-list',
  imports: [MakerReasons],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul>
      @for (maker of makers(); track maker.fabricator.id) {
        <li [class.no]="!maker.canBuild">
          <p>
            <b>{{ maker.fabricator.name }}</b>
            <span class="sy-soft sy-small">{{ maker.canBuild ? 'can build it' : 'cannot build it' }}</span>
          </p>
          @if (!maker.canBuild) {
            <app-maker-reasons [maker]="maker.fabricator.id" [reasons]="maker.reasons" />
          }
        </li>
      }
    </ul>
  `,
  styles: `
    ul {
      display: grid;
      gap: 10px;
      margin: 0;
      padding: 0;
      list-style: none;
    }
    li {
      padding: 11px 14px;
      border: 1px solid var(--sy-line);
      border-radius: 8px;
      background: var(--sy-sheet);
    }
    .no {
      background: none;
    }
    p {
      display: flex;
      flex-wrap: wrap;
      justify-content: space-between;
      gap: 0 12px;
    }
    b {
      font-weight: 400;
    }
  `,
})
export class MakerList {
  /** makers that stand elsewhere on the page */
  readonly except = input<readonly string[]>([]);
  private readonly draft = inject(UnitDraft);
  protected readonly makers = computed(() =>
    this.draft.evaluation().buildability.filter(({ fabricator }) => !this.except().includes(fabricator.id)),
  );
}
