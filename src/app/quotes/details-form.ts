import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal, untracked } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { type FormControl, NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { map } from 'rxjs';
import { dayIn } from '@shared/calendar/days';
import { markUp } from '@shared/contracts/primitives';
import { customer, type Quote } from '@shared/contracts/quotes';
import { type ProblemError } from '../api-client/problem-error';
import { Session } from '../session/session';
import { DayPipe } from '../ui/date-pipes';
import { fits, showAtFields } from '../ui/field-problems';
import { Icon } from '../ui/icon';
import { ProblemNote } from '../ui/problem-note';
import { ReadableDaysPipe } from '../ui/readable-days-pipe';
import { QuoteDesk } from './quote-desk';

type Fields = 'name' | 'email' | 'address' | 'markUpPercent' | 'validUntil' | 'notes';

function valuesOf({ customer, markUpPercent, validUntil, notes }: Quote): Record<Fields, string> {
  return {
    name: customer?.name ?? '',
    email: customer?.email ?? '',
    address: customer?.address ?? '',
    markUpPercent: /[1-9]/.test(markUpPercent) ? markUpPercent : '',
    validUntil,
    notes,
  };
}

/** The dealer's customer, mark-up, notes and validity of a quote: typed freely, saved on purpose. */
@Component({
  selector: 'app-details-form',
  imports: [ReactiveFormsModule, MatButton, MatFormFieldModule, MatInput, Icon, ProblemNote, ReadableDaysPipe],
  providers: [DayPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './details-form.html',
  styles: `
    form {
      display: grid;
      gap: 4px;
    }
    .row {
      display: grid;
      grid-template-columns: 1fr 1fr;
      gap: 12px;
    }
    h2 {
      margin-bottom: 2px;
    }
    .only-you {
      margin-bottom: 12px;
    }
    .save {
      display: flex;
      flex-wrap: wrap;
      align-items: center;
      gap: 8px;
    }
  `,
})
export class DetailsForm {
  readonly quote = input.required<Quote>();
  protected readonly desk = inject(QuoteDesk);
  private readonly timeZone = inject(Session).user()?.company.timeZone ?? 'UTC';
  protected readonly form = inject(NonNullableFormBuilder).group({
    name: ['', [fits(customer.shape.name)]],
    email: ['', [fits(customer.shape.email.unwrap())]],
    address: ['', [fits(customer.shape.address.unwrap())]],
    markUpPercent: ['', [fits(markUp)]],
    validUntil: ['', [Validators.required]],
    notes: [''],
  });
  protected readonly problem = signal<ProblemError | null>(null);
  protected readonly said = signal('');
  protected readonly saving = signal(false);
  private readonly typed = toSignal(this.form.valueChanges.pipe(map(() => this.form.getRawValue())), {
    initialValue: this.form.getRawValue(),
  });
  /** Saved values that somebody else wrote while one was typing others, by field. */
  protected readonly theirs = signal<Partial<Record<Fields, string>>>({});
  /** the saved values that the fields were filled from */
  private readonly base = signal<Record<Fields, string> | null>(null);

  readonly dirty = computed(() => {
    const base = this.base();
    const typed = this.typed();
    return base !== null && (Object.keys(base) as Fields[]).some((field) => typed[field].trim() !== base[field]);
  });
  protected readonly earliest = computed(() => dayIn(this.timeZone, Date.now()));

  constructor() {
    effect(() => {
      const saved = valuesOf(this.quote());
      untracked(() => this.takeOver(saved));
    });
    effect(() => {
      if (this.quote().state === 'ordered') this.form.disable({ emitEvent: false });
    });
  }

  protected async save(): Promise<void> {
    this.said.set('');
    const { name, email, address, markUpPercent, validUntil, notes } = trimmed(this.form.getRawValue());
    if (name === '' && (email !== '' || address !== '')) this.form.controls.name.setErrors({ said: 'Write the customer’s name.' });
    this.form.markAllAsTouched();
    if (this.form.invalid || this.saving()) return;
    const base = this.base();
    this.saving.set(true);
    const problem = await this.desk.saveDetails({
      customer: name === '' ? null : { name, ...(email === '' ? {} : { email }), ...(address === '' ? {} : { address }) },
      markUpPercent: markUpPercent === '' ? '0' : markUpPercent,
      notes,
      // A day that is past stays as it is until the quote is priced anew; sending it would be refused.
      ...(validUntil === base?.validUntil ? {} : { validUntil }),
    });
    this.saving.set(false);
    const { controls } = this.form;
    const placed =
      problem !== null &&
      showAtFields(problem, {
        '/customer/name': controls.name,
        '/customer/email': controls.email,
        '/customer/address': controls.address,
        '/markUpPercent': controls.markUpPercent,
        '/validUntil': controls.validUntil,
        '/notes': controls.notes,
      });
    this.problem.set(placed || problem?.code === 'changed-meanwhile' ? null : problem);
    if (problem === null) {
      this.said.set('Saved');
      this.takeOver(valuesOf(this.quote()), true);
    }
  }

  protected discard(): void {
    this.problem.set(null);
    this.takeOver(valuesOf(this.quote()), true);
  }

  protected fieldText(control: FormControl<string>, otherwise: string): string {
    return (control.getError('said') as string | null) ?? otherwise;
  }

  /** Fills the fields with what is saved, except those in which one is typing something else. */
  private takeOver(saved: Record<Fields, string>, all = false): void {
    const base = this.base();
    const typed = trimmed(this.form.getRawValue());
    const theirs: Partial<Record<Fields, string>> = {};
    const next: Partial<Record<Fields, string>> = {};
    for (const field of Object.keys(saved) as Fields[]) {
      const untouched = all || base === null || typed[field] === base[field] || typed[field] === saved[field];
      if (untouched) next[field] = saved[field];
      else if (base[field] !== saved[field]) theirs[field] = saved[field] === '' ? 'nothing' : saved[field];
    }
    this.base.set(saved);
    this.theirs.set(theirs);
    this.form.patchValue(next);
    if (all || base === null) this.form.markAsUntouched();
  }
}

function trimmed<T extends Record<string, string>>(values: T): T {
  return Object.fromEntries(Object.entries(values).map(([field, value]) => [field, value.trim()])) as T;
}
