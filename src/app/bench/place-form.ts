import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { formatLength } from '@shared/measures/format-length';
import { formatAltitude } from '@shared/measures/format-quantity';
import { LengthField } from '../ui/length-field';
import { type PlaceLength, placeQuestions, type PlaceQuestion } from './draft';
import { readAltitude } from './read-altitude';
import { TextField } from './text-field';
import { ThreeAnswers } from './three-answers';
import { UnitDraft } from './unit-draft';

const questions: Record<PlaceQuestion, { imperial: string; metric: string; yes: string }> = {
  door: { imperial: 'In a door', metric: 'In a door', yes: 'in a door' },
  nearDoor: { imperial: 'A door within 24 in', metric: 'A door within 610 mm', yes: 'beside a door' },
  wetArea: { imperial: 'Bath, shower or pool within 60 in', metric: 'Bath, shower or pool within 1 524 mm', yes: 'wet area' },
  stairs: { imperial: 'Stairs, ramp or landing within 36 in', metric: 'Stairs, ramp or landing within 914 mm', yes: 'by stairs' },
  footOfStairs: { imperial: 'Bottom of stairs within 60 in', metric: 'Bottom of stairs within 1 524 mm', yes: 'foot of stairs' },
};

/** Where the unit goes, as far as it is known: nothing of it changes a price. */
@Component({
  selector: 'app-place-form',
  imports: [LengthField, TextField, ThreeAnswers],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './place-form.html',
  styleUrl: './place-form.scss',
})
export class PlaceForm {
  protected readonly draft = inject(UnitDraft);
  protected readonly opened = signal<'edges' | 'doors' | 'site' | null>(null);
  protected readonly place = computed(() => this.draft.draft().place);
  protected readonly questions = placeQuestions.map((name) => ({ name, ...questions[name] }));
  protected readonly lengths: { name: PlaceLength; label: string; zero: boolean }[] = [
    { name: 'bottomEdge', label: 'Bottom edge above the floor', zero: true },
    { name: 'topEdge', label: 'Top edge above the floor', zero: false },
    { name: 'walkingSurface', label: 'To the nearest walking surface', zero: true },
  ];

  protected readonly edges = computed(() => {
    const { bottomEdge, topEdge } = this.draft.reading().unit?.place ?? {};
    const words = (metres: number) => formatLength(String(Number((metres * 1000).toFixed(4))), this.draft.system());
    if (bottomEdge !== undefined) return bottomEdge === 0 ? 'on the floor' : `from ${words(bottomEdge)}`;
    return topEdge === undefined ? 'not known' : `up to ${words(topEdge)}`;
  });
  protected readonly doors = computed(() => {
    const place = this.place();
    const yes = this.questions.filter(({ name }) => place[name]).map((question) => question.yes);
    if (yes.length > 0) return yes.join(', ');
    return this.questions.every(({ name }) => place[name] === false) ? 'no' : 'not known';
  });
  protected readonly site = computed(() => {
    const altitude = readAltitude(this.place().altitude, this.draft.system());
    return 'value' in altitude && altitude.value !== null ? formatAltitude(altitude.value, this.draft.system()) : 'not known';
  });
  protected readonly altitudeUnit = computed(() => (this.draft.system() === 'imperial' ? 'ft' : 'm'));
  protected readonly temperatureUnit = computed(() => (this.draft.system() === 'imperial' ? '°F' : '°C'));
  protected readonly problems = computed(() => ({
    altitude: this.draft.problemAt('/place/altitude'),
    outsideTemperature: this.draft.problemAt('/place/outsideTemperature'),
    insideHumidity: this.draft.problemAt('/place/insideHumidity'),
  }));

  protected type(length: PlaceLength, text: string): void {
    this.draft.typePlace({ [length]: text });
  }

  protected answer(question: PlaceQuestion, value: boolean | undefined): void {
    this.draft.choosePlace({ [question]: value });
  }

  protected toggle(row: 'edges' | 'doors' | 'site'): void {
    this.opened.update((open) => (open === row ? null : row));
  }
}
