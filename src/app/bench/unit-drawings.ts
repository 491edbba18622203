import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { elevation } from '@shared/drawings/elevation';
import { section } from '@shared/drawings/section';
import { Drawing } from '../ui/drawing/drawing';
import { UnitDraft } from './unit-draft';

/** Elevation and section to scale. Where the fields cannot be read, the last drawing stays and says so. */
@Component({
  selector: 'app-unit-drawings',
  imports: [Drawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="drawings" [class.behind]="draft.behind()">
      <app-drawing [drawing]="elevation()" />
      <app-drawing [drawing]="section()" />
    </div>
    @if (draft.behind()) {
      <p class="mark">Shown as it last could be: one of the fields cannot be used as it stands.</p>
    }
  `,
  styles: `
    :host {
      display: block;
      position: relative;
    }
    .drawings {
      display: flex;
      gap: 8px;
      max-width: 720px;
      margin: 0 auto;
    }
    .behind {
      opacity: 0.45;
    }
    .mark {
      position: absolute;
      inset: 50% 0 auto;
      width: fit-content;
      max-width: 92%;
      margin: -18px auto 0;
      padding: 6px 14px;
      border: 1px solid var(--sy-edge);
      border-radius: 8px;
      background: var(--sy-sheet);
      font-size: 14px;
    }
  `,
})
export class UnitDrawings {
  protected readonly draft = inject(UnitDraft);
  private readonly tag = computed(() => this.draft.reading().tag);
  protected readonly elevation = computed(() =>
    elevation(this.draft.shown(), this.draft.catalogue(), { system: this.draft.system(), tag: this.tag() }),
  );
  protected readonly section = computed(() => section(this.draft.shown(), this.draft.catalogue(), { system: this.draft.system() }));
}
