import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { loadCaution, placeCautions } from './cautions';
import { UnitDraft } from './unit-draft';

/** Cautions about the unit and its place. They advise; they never certify. */
@Component({
  selector: 'app-caution-notes',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (caution of cautions(); track $index) {
      <div [class]="caution.tone === 'caution' ? 'sy-note' : 'remark'">
        <p>
          <b>{{ caution.lead }}</b> {{ caution.text }}
        </p>
        @if (caution.details.length > 0) {
          <details>
            <summary>What was checked</summary>
            <ul>
              @for (detail of caution.details; track detail) {
                <li>{{ detail }}</li>
              }
            </ul>
          </details>
        }
      </div>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      align-content: start;
    }
    .remark {
      border-left: 3px solid var(--sy-line);
      padding: 9px 14px;
      font-size: 14px;
    }
    details {
      font-size: 13px;
    }
    summary {
      width: fit-content;
      min-height: 24px;
      color: var(--sy-soft);
      cursor: pointer;
    }
    ul {
      margin: 2px 0 0;
      padding-left: 18px;
    }
  `,
})
export class CautionNotes {
  private readonly draft = inject(UnitDraft);
  /** what the unit bears, or what its place asks for */
  readonly about = input.required<'loads' | 'place'>();
  protected readonly cautions = computed(() => {
    const evaluation = this.draft.evaluation();
    if (this.about() === 'loads') return [loadCaution(evaluation)];
    return placeCautions(evaluation, this.draft.shown().place?.altitude, this.draft.catalogue(), this.draft.system());
  });
}
