import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { LayerList } from './layer-list';
import { TextField } from './text-field';
import { UnitDraft } from './unit-draft';

/** The make-up from outside in: as the trade writes it, and layer by layer, in step with each other. */
@Component({
  selector: 'app-make-up-form',
  imports: [LayerList, TextField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-text-field
      label="As you would write it"
      [longest]="200"
      [text]="draft.makeUp()"
      [problem]="problem()"
      (typed)="draft.typeMakeUp($event)"
      (left)="draft.settleMakeUp()"
      (entered)="draft.settleMakeUp()"
    />
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
  protected readonly problem = computed(() => this.draft.problemAt('/makeUp'));
}
