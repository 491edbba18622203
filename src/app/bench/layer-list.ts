import { ChangeDetectionStrategy, Component, computed, ElementRef, inject, signal } from '@angular/core';
import { CavityFields } from './cavity-fields';
import { FieldNote } from './field-note';
import { type LayerRow, rowsOf } from './layer-rows';
import { LiteFields } from './lite-fields';
import { NobodyBuilds } from './nobody-builds';
import { UnitDraft } from './unit-draft';

/** The layers of the unit from outside in; the opened one shows what one can choose. */
@Component({
  selector: 'app-layer-list',
  imports: [CavityFields, FieldNote, LiteFields],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './layer-list.html',
  styleUrl: './layer-list.scss',
})
export class LayerList {
  protected readonly draft = inject(UnitDraft);
  private readonly nobody = inject(NobodyBuilds);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  protected readonly opened = signal<string | null>(null);

  protected readonly rows = computed(() =>
    rowsOf(this.draft.draft(), this.draft.catalogue()).map((row) => ({
      ...row,
      problem: this.draft.problemAt(row.pointer),
      note: this.nobody.at(row.pointer),
    })),
  );

  protected toggle({ pointer }: LayerRow): void {
    this.opened.update((open) => (open === pointer ? null : pointer));
  }

  /** Arrow keys walk from layer to layer. */
  protected walk(event: Event, by: 1 | -1): void {
    const heads = [...this.host.nativeElement.querySelectorAll<HTMLElement>('.head')];
    const next = heads[heads.indexOf(event.target as HTMLElement) + by];
    if (!next) return;
    event.preventDefault();
    next.focus();
  }
}
