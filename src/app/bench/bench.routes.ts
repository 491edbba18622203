import { type Routes } from '@angular/router';
import { type Head } from '../ui/page-meta';
import { ChosenMaker } from './chosen-maker';
import { CurrentQuotes } from './current-quotes';
import { LivePrice } from './live-price';
import { NobodyBuilds } from './nobody-builds';
import { ReaderMeasures } from './reader-measures';
import { UnitDraft } from './unit-draft';

const head: Head = {
  title: 'Bench',
  path: '/bench',
  description:
    'Specify a made-to-size sealed unit: drawn to scale as you type, with weight, thickness, U-value, solar gain, condensation, safety glazing and who can build it.',
};

export const benchRoutes: Routes = [
  {
    path: '',
    data: { head },
    providers: [ReaderMeasures, UnitDraft, LivePrice, ChosenMaker, CurrentQuotes, NobodyBuilds],
    loadComponent: async () => (await import('./bench-page')).BenchPage,
  },
];
