import { computed, effect, inject, Injectable, linkedSignal, signal, untracked } from '@angular/core';
import { type Evaluation } from '@shared/contracts/evaluation';
import { type Lite, type Unit } from '@shared/contracts/units';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { makeUpText } from '@shared/glazing/make-up-text';
import { parseMakeUp } from '@shared/glazing/parse-make-up';
import { CurrentCatalogue } from '../api-client/current-catalogue';
import { lengthText } from '../ui/read-length';
import { type Cavity, type Draft, firstDraft, readDraft, type ReadDraft } from './draft';
import { addLite, removeLite, swapSides } from './layers';
import { type Buildable } from './apply-reason';
import { ReaderMeasures } from './reader-measures';
import { rewriteDraft } from './rewrite-draft';

/** How the draft was changed last: what is typed gathers in one entry of the history, what is chosen is one of its own. */
export type Change = 'typed' | 'chosen';

const sameText = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);

/**
 * The line on the Bench: as it is typed, what it says, and what the engineering makes of it.
 * Lives as long as the application, so that leaving the Bench loses nothing. To be used once the
 * catalogue is at hand.
 */
@Injectable()
export class UnitDraft {
  private readonly measures = inject(ReaderMeasures);
  private readonly source = inject(CurrentCatalogue);
  readonly catalogue = computed(() => {
    const catalogue = this.source.catalogue();
    if (!catalogue) throw new Error('the Bench needs the catalogue');
    return catalogue;
  });

  private readonly now = signal<Draft>(untracked(() => firstDraft(this.measures.system(), this.catalogue())));
  private readonly how = signal<Change>('chosen');
  readonly draft = this.now.asReadonly();
  readonly lastChange = this.how.asReadonly();
  /** what of an address could not be used, a few words each */
  readonly ignored = signal<readonly string[]>([]);

  readonly system = computed(() => this.now().system);
  readonly reading = computed<ReadDraft>(() => readDraft(this.now(), this.catalogue()));
  /** null while the draft is no unit that could exist */
  readonly unit = computed(() => this.reading().unit, { equal: sameText });
  readonly quantity = computed(() => this.reading().quantity);
  /** the unit to show: the last one that could be read */
  readonly shown = linkedSignal<Unit | null, Unit>({
    source: this.unit,
    computation: (unit, before) => unit ?? before?.value ?? readDraft(firstDraft(this.system(), this.catalogue()), this.catalogue()).unit!,
  });
  /** what is shown is not what stands in the fields */
  readonly behind = computed(() => this.unit() === null);
  readonly evaluation = computed<Evaluation>(() => evaluateUnit(this.shown(), this.catalogue()));
  /** the make-up as the trade writes it, or as it is being typed */
  readonly makeUp = computed(() => this.now().makeUp ?? makeUpText(this.now(), this.catalogue()));

  constructor() {
    effect(() => {
      const system = this.measures.system();
      untracked(() => this.now.update((draft) => rewriteDraft(draft, system)));
    });
  }

  /** The message at a field, by JSON pointer; fields below it count too. */
  problemAt(pointer: string): string | null {
    const found = this.reading().problems.find((problem) => problem.pointer === pointer || problem.pointer.startsWith(`${pointer}/`));
    return found ? sentence(found.detail) : null;
  }

  /** Takes over a whole draft, such as the address says. */
  replace(draft: Draft, ignored: readonly string[]): void {
    this.how.set('chosen');
    this.now.set(rewriteDraft(draft, this.measures.system()));
    this.ignored.set(ignored);
  }

  type(change: Partial<Pick<Draft, 'width' | 'height' | 'quantity' | 'tag'>>): void {
    this.change('typed', change);
  }

  /** @param text as it is typed; the layers follow as soon as it can be read */
  typeMakeUp(text: string): void {
    const parsed = parseMakeUp(text, this.catalogue(), this.now());
    this.change('typed', { makeUp: text, ...('problem' in parsed ? {} : { lites: parsed.lites, cavities: parsed.cavities }) });
  }

  /** The make-up field was left: a text that could be read is written as the trade writes it. */
  settleMakeUp(): void {
    const { makeUp } = this.now();
    if (makeUp !== null && !('problem' in parseMakeUp(makeUp, this.catalogue(), this.now())))
      this.now.update((draft) => ({ ...draft, makeUp: null }));
  }

  typePlace(change: Partial<Draft['place']>): void {
    this.change('typed', { place: { ...this.now().place, ...change } });
  }

  choosePlace(change: Partial<Draft['place']>): void {
    this.change('chosen', { place: { ...this.now().place, ...change } });
  }

  chooseLite(index: number, change: Partial<Lite>): void {
    this.chooseLayers({ lites: this.now().lites.map((lite, i) => (i === index ? without({ ...lite, ...change }) : lite)) });
  }

  chooseCavity(index: number, change: Partial<Cavity>): void {
    this.chooseLayers({ cavities: this.now().cavities.map((cavity, i) => (i === index ? without({ ...cavity, ...change }) : cavity)) });
  }

  addLite(): void {
    this.chooseLayers(addLite(this.now()));
  }

  removeLite(index: number): void {
    this.chooseLayers(removeLite(this.now(), index));
  }

  swapSides(): void {
    this.chooseLayers(swapSides(this.now()));
  }

  /** @param width @param height mm, decimal strings */
  chooseSize(width: string, height: string): void {
    this.change('chosen', { width: lengthText(width, this.system()), height: lengthText(height, this.system()) });
  }

  /** Takes over size and layers, such as the nearest that a maker can build. Texts that mean the same stay as they were typed. */
  take({ width, height, lites, cavities }: Buildable): void {
    const shown = this.shown();
    const text = (field: 'width' | 'height', mm: string) => (mm === shown[field] ? this.now()[field] : lengthText(mm, this.system()));
    this.change('chosen', { width: text('width', width), height: text('height', height), lites, cavities, makeUp: null });
  }

  private chooseLayers(change: Partial<Pick<Draft, 'lites' | 'cavities'>>): void {
    this.change('chosen', { ...change, makeUp: null });
  }

  private change(how: Change, change: Partial<Draft>): void {
    this.how.set(how);
    this.now.update((draft) => ({ ...draft, ...change }));
  }
}

/** Leaves out what was set to undefined, as the contract does. */
function without<T extends object>(value: T): T {
  return Object.fromEntries(Object.entries(value).filter(([, part]) => part !== undefined && part !== false)) as T;
}

function sentence(text: string): string {
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}${/[.!?]$/.test(text) ? '' : '.'}`;
}
