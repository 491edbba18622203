import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { ChoiceField, type Option } from './choice-field';
import { UnitDraft } from './unit-draft';

/** What one can choose of a lite. Only coatings and surfaces that go together are offered. */
@Component({
  selector: 'app-lite-fields',
  imports: [ChoiceField],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-choice-field
      class="wide"
      label="Glass"
      [options]="glasses()"
      [value]="lite().glass"
      (chosen)="draft.chooseLite(index(), { glass: $event })"
    />
    <app-choice-field
      label="Treatment"
      [options]="treatments()"
      [value]="lite().treatment"
      (chosen)="draft.chooseLite(index(), { treatment: $event })"
    />
    <app-choice-field label="Edges" [options]="edges()" [value]="lite().edgeWork ?? ''" (chosen)="chooseEdges($event)" />
    <app-choice-field class="wide" label="Coating" [options]="coatings()" [value]="coating()" (chosen)="chooseCoating($event)" />
    @if (draft.draft().lites.length > 2) {
      <button type="button" class="quiet wide" (click)="remove()">Take out this lite</button>
    }
  `,
  styleUrls: ['./layer-fields.scss', './quiet.scss'],
})
export class LiteFields {
  readonly index = input.required<number>();
  readonly removed = output();
  protected readonly draft = inject(UnitDraft);
  protected readonly lite = computed(() => this.draft.draft().lites[this.index()]!);

  protected readonly glasses = computed(() => this.draft.catalogue().glasses.map(asOption));
  protected readonly treatments = computed(() => this.draft.catalogue().treatments.map(asOption));
  protected readonly edges = computed(() => [{ value: '', label: 'As cut' }, ...this.draft.catalogue().edgeWork.map(asOption)]);
  protected readonly coating = computed(() => {
    const { coating } = this.lite();
    return coating ? `${coating.id}@${coating.surface}` : '';
  });
  protected readonly coatings = computed<Option[]>(() => {
    const last = 2 * this.draft.draft().lites.length;
    const own = [2 * this.index() + 1, 2 * this.index() + 2];
    const options = this.draft.catalogue().coatings.flatMap(({ id, name, kind }) =>
      own
        // A soft coat lasts only where it faces a cavity; one that is there already stays in the list.
        .filter((surface) => kind === 'hard' || (surface !== 1 && surface !== last) || this.coating() === `${id}@${surface}`)
        .map((surface) => ({ value: `${id}@${surface}`, label: `${capital(name)}, surface ${surface}` })),
    );
    return [{ value: '', label: 'None' }, ...options];
  });

  protected chooseEdges(id: string): void {
    this.draft.chooseLite(this.index(), { edgeWork: id || undefined });
  }

  protected chooseCoating(value: string): void {
    const [id = '', surface] = value.split('@');
    this.draft.chooseLite(this.index(), { coating: value ? { id, surface: Number(surface) } : undefined });
  }

  protected remove(): void {
    this.draft.removeLite(this.index());
    this.removed.emit();
  }
}

function asOption({ id, name }: { id: string; name: string }): Option {
  return { value: id, label: capital(name) };
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
