import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { LayerList } from './layer-list';
import { MakeUpField } from './make-up-field';
import { UnitDraft } from './unit-draft';

/** The make-up from outside in: as the trade writes it, and layer by layer, in step with each other. */
@Component({
  selector: 'app-make-up-form',
  imports: [LayerList, MakeUpField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-make-up-field />
    <app-layer-list />
    <p>
      @if (draft.draft().lites.length < 3) {
        <button type="button" class="quiet" (click)="draft.addLite()">Add a third lite</button>
      }
      <button type="button" class="quiet" (click)="draft.swapSides()">Swap sides</button>
    </p>
  `,
  styleUrl: './quiet.scss',
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 10px;
    }
    p {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 20px;
    }
  `,
})
export class MakeUpForm {
  protected readonly draft = inject(UnitDraft);
}
