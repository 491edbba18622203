import { type Routes } from '@angular/router';
import { ChosenMaker } from './chosen-maker';
import { CurrentQuotes } from './current-quotes';
import { LivePrice } from './live-price';
import { NobodyBuilds } from './nobody-builds';
import { ReaderMeasures } from './reader-measures';
import { UnitDraft } from './unit-draft';

export const benchRoutes: Routes = [
  {
    path: '',
    title: 'Bench',
    providers: [ReaderMeasures, UnitDraft, LivePrice, ChosenMaker, CurrentQuotes, NobodyBuilds],
    loadComponent: async () => (await import('./bench-page')).BenchPage,
  },
];
