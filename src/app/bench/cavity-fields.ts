import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { ChoiceField } from './choice-field';
import { UnitDraft } from './unit-draft';

/** What one can choose of a cavity. Widths are those that the spacer comes in. */
@Component({
  selector: 'app-cavity-fields',
  imports: [ChoiceField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-choice-field
      label="Width"
      [options]="widths()"
      [value]="cavity().width"
      (chosen)="draft.chooseCavity(index(), { width: $event })"
    />
    <app-choice-field label="Gas" [options]="gases()" [value]="cavity().gas" (chosen)="draft.chooseCavity(index(), { gas: $event })" />
    <app-choice-field
      label="Spacer"
      [options]="spacers()"
      [value]="cavity().spacer"
      (chosen)="draft.chooseCavity(index(), { spacer: $event })"
    />
    <app-choice-field
      label="Capillary tube"
      [options]="tubes"
      [value]="cavity().capillary ? 'open' : 'none'"
      (chosen)="draft.chooseCavity(index(), { capillary: $event === 'open' || undefined })"
    />
  `,
  styleUrl: './layer-fields.scss',
})
export class CavityFields {
  readonly index = input.required<number>();
  protected readonly draft = inject(UnitDraft);
  protected readonly cavity = computed(() => this.draft.draft().cavities[this.index()]!);

  protected readonly widths = computed(() => {
    const { width, spacer } = this.cavity();
    const offered = this.draft.catalogue().spacers.find(({ id }) => id === spacer)?.widthsMm ?? [];
    // A width that was typed or linked stays in the list, even where no spacer comes in it.
    const all = offered.includes(width) ? offered : [...offered, width].sort((a, b) => Number(a) - Number(b));
    return all.map((each) => ({ value: each, label: `${each} mm` }));
  });
  protected readonly gases = computed(() => this.draft.catalogue().gases.map(asOption));
  protected readonly spacers = computed(() => this.draft.catalogue().spacers.map(asOption));
  protected readonly tubes = [
    { value: 'none', label: 'None' },
    { value: 'open', label: 'Open' },
  ];
}

function asOption({ id, name }: { id: string; name: string }) {
  return { value: id, label: name.charAt(0).toUpperCase() + name.slice(1) };
}
