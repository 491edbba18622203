import { LiveAnnouncer } from '@angular/cdk/a11y';
import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  ElementRef,
  inject,
  Injector,
  input,
  model,
  signal,
} from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';
import { quantity as quantitySchema } from '@shared/contracts/primitives';
import { type Hint } from '@shared/contracts/prices';
import { type Quote, type QuoteLine } from '@shared/contracts/quotes';
import { lengthForEditing } from '@shared/measures/format-length';
import { parseLength } from '@shared/measures/parse-length';
import { type ProblemError } from '../api-client/problem-error';
import { Session } from '../session/session';
import { Icon } from '../ui/icon';
import { LineSheet } from '../ui/line-sheet';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { SizePipe } from '../ui/size-pipe';
import { UnitThumb } from '../ui/unit-thumb';
import { InPlaceField } from './in-place-field';
import { changeLine, copyLine, moveLine } from './line-edits';
import { QuoteDesk } from './quote-desk';

type Save = (text: string) => Promise<string | null>;

/** A line with what its fields show and how each of them is saved. */
interface Row {
  line: QuoteLine;
  /** how people speak of it: its tag, or its number in the list */
  name: string;
  first: boolean;
  last: boolean;
  width: string;
  height: string;
  saveTag: Save;
  saveWidth: Save;
  saveHeight: Save;
  saveQuantity: Save;
}

/** The lines of a quote: changed in place, copied, moved, removed and put back, or opened. */
@Component({
  selector: 'app-quote-lines',
  imports: [
    MatButton,
    MatIconButton,
    MatTableModule,
    RouterLink,
    Icon,
    InPlaceField,
    LineSheet,
    MoneyPipe,
    ProblemNote,
    SizePipe,
    UnitThumb,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './quote-lines.html',
  styleUrls: ['../ui/work-table.scss', './quote-lines.scss'],
})
export class QuoteLines {
  readonly quote = input.required<Quote>();
  /** the line that is open; in the address */
  readonly opened = model<string>();
  protected readonly desk = inject(QuoteDesk);
  private readonly announcer = inject(LiveAnnouncer);
  private readonly injector = inject(Injector);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  protected readonly system = inject(Session).user()?.company.measureSystem ?? 'metric';
  protected readonly columns = ['drawing', 'tag', 'size', 'makeUp', 'quantity', 'unitPrice', 'linePrice', 'actions'];

  /** What a press on a button ran into, until the next one. */
  protected readonly problem = signal<ProblemError | null>(null);
  protected readonly canEdit = computed(() => this.quote().state === 'open');
  protected readonly hasRetail = computed(() => /[1-9]/.test(this.quote().markUpPercent));
  protected readonly rows = computed(() => this.quote().lines.map((line, i, { length }) => this.toRow(line, i, length)));
  /** The Bench takes up this quote for its next lines. */
  protected readonly onBench = computed(() => ({ quote: this.quote().id, maker: this.quote().fabricator.id }));
  protected readonly byId = (_: number, { line }: Row) => line.id;
  protected readonly isOpen = (_: number, { line }: Row) => line.id === this.opened();

  protected toggle({ id }: QuoteLine): void {
    this.opened.update((open) => (open === id ? undefined : id));
  }

  protected async copy({ line, name }: Row): Promise<void> {
    await this.run(this.desk.editLines(copyLine(line.id)), `${name} copied`);
  }

  protected async resize({ line, name }: Row, { width, height }: Hint): Promise<void> {
    const unit = { ...this.now(line).unit, width, height };
    await this.run(this.desk.editLines(changeLine(line.id, { unit })), `${name} has another size`);
  }

  protected async move({ line, name }: Row, by: -1 | 1, button?: Event): Promise<void> {
    const field = button ? null : this.host.nativeElement.ownerDocument.activeElement;
    const problem = await this.run(this.desk.editLines(moveLine(line.id, by)), `${name} moved ${by < 0 ? 'up' : 'down'}`);
    // The row has moved in the page, which takes the focus away from it.
    if (problem === null) this.focusAfterRender(() => (field instanceof HTMLElement ? field : this.buttonOf(line.id, by)));
  }

  protected async remove(row: Row): Promise<void> {
    const problem = await this.run(this.desk.remove(row.line), `${row.name} removed`);
    if (problem === null) this.focusAfterRender(() => this.find('.put-back'));
  }

  protected async putBack(): Promise<void> {
    const index = this.desk.removed()?.index ?? 0;
    const problem = await this.run(this.desk.putBack(), 'The line is back');
    const line = this.desk.quote()?.lines[index];
    if (problem === null && line) this.focusAfterRender(() => this.find(`[data-line="${line.id}"] input`));
  }

  /** Alt with an arrow moves the line from any of its fields. */
  protected byKey(event: KeyboardEvent, row: Row): void {
    if (!event.altKey || !this.canEdit() || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
    event.preventDefault();
    void this.move(row, event.key === 'ArrowUp' ? -1 : 1);
  }

  private async run(work: Promise<ProblemError | null>, done: string): Promise<ProblemError | null> {
    const problem = await work;
    this.problem.set(problem);
    if (problem === null) void this.announcer.announce(done);
    return problem;
  }

  private toRow(line: QuoteLine, i: number, length: number): Row {
    const change =
      (pointer: string, of: (text: string) => Parameters<typeof changeLine>[1] | string): Save =>
      async (text) => {
        const next = of(text);
        if (typeof next === 'string') return next;
        return reason(await this.desk.editLines(changeLine(line.id, next)), `/lines/${this.indexOf(line.id)}${pointer}`);
      };
    const size = (side: 'width' | 'height') =>
      change(`/unit/${side}`, (text) => {
        const parsed = parseLength(text, this.system);
        return 'problem' in parsed ? parsed.problem : { unit: { ...this.now(line).unit, [side]: parsed.mm } };
      });
    return {
      line,
      name: line.tag ?? `line ${i + 1}`,
      first: i === 0,
      last: i === length - 1,
      width: lengthForEditing(line.unit.width, this.system),
      height: lengthForEditing(line.unit.height, this.system),
      saveTag: change('/tag', (text) => (text.length > 80 ? 'At most 80 letters.' : { tag: text === '' ? null : text })),
      saveWidth: size('width'),
      saveHeight: size('height'),
      saveQuantity: change('/quantity', (text) => {
        const parsed = quantitySchema.safeParse(/^\d{1,6}$/.test(text) ? Number(text) : NaN);
        return parsed.success ? { quantity: parsed.data } : 'A whole number from 1 to 10 000.';
      }),
    };
  }

  /** The line as it is now: an edit of the width must not undo one of the height that was saved meanwhile. */
  private now(line: QuoteLine): QuoteLine {
    return this.quote().lines.find(({ id }) => id === line.id) ?? line;
  }

  private indexOf(id: string): number {
    return this.quote().lines.findIndex((line) => line.id === id);
  }

  private buttonOf(id: string, by: -1 | 1): HTMLElement | null {
    // At an end of the list that way is closed; the other button takes over.
    const [same, other] = by < 0 ? ['up', 'down'] : ['down', 'up'];
    const button = this.find<HTMLButtonElement>(`[data-line="${id}"] .${same}`);
    return button?.disabled ? this.find(`[data-line="${id}"] .${other}`) : button;
  }

  private find<E extends HTMLElement = HTMLElement>(selector: string): E | null {
    return this.host.nativeElement.querySelector<E>(selector);
  }

  private focusAfterRender(find: () => HTMLElement | null): void {
    afterNextRender(() => find()?.focus(), { injector: this.injector });
  }
}

/** What is wrong, for the field it is about; other troubles are said there too, so that nothing typed is lost silently. */
function reason(problem: ProblemError | null, pointer: string): string | null {
  if (!problem) return null;
  const own = problem.errors.find((error) => error.pointer.startsWith(pointer));
  return own ? own.detail : problem.detail;
}
