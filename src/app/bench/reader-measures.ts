import { computed, DOCUMENT, inject, Injectable, signal } from '@angular/core';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { Session } from '../session/session';

const KEPT = 'measures';

/** Inches or millimetres: the company's for those who are signed in; visitors choose, and keep their choice. */
@Injectable()
export class ReaderMeasures {
  private readonly session = inject(Session);
  private readonly document = inject(DOCUMENT);
  private readonly chosen = signal<MeasureSystem>('imperial');

  readonly system = computed<MeasureSystem>(() => this.session.user()?.company.measureSystem ?? this.chosen());
  readonly mayChoose = computed(() => this.session.user() === null);

  choose(system: MeasureSystem): void {
    this.chosen.set(system);
    try {
      this.document.defaultView?.localStorage.setItem(KEPT, system);
    } catch {
      // Storage may be closed to us; the choice then lasts as long as the page.
    }
  }

  /** Takes up the choice of an earlier visit; the server cannot know it. To be called in the browser, once the page stands. */
  recall(): void {
    try {
      const kept = this.document.defaultView?.localStorage.getItem(KEPT);
      if (kept === 'imperial' || kept === 'metric') this.chosen.set(kept);
    } catch {
      // As above: then it stays as it is.
    }
  }
}
