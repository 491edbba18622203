import { type ActivatedRouteSnapshot, type Routes } from '@angular/router';
import { type Catalogue } from '@shared/contracts/catalogue';
import { catalogueParts } from '@shared/contracts/catalogue-parts';
import {
  frontHead,
  itemHead,
  makerHead,
  makersHead,
  makingHead,
  missingHead,
  outOfReachHead,
  overviewHead,
  partHead,
  questionsHead,
  sizesHead,
} from './heads';
import { questionsOf } from './questions';
import { readCatalogue } from './read-catalogue';

/** The catalogue is read before a page opens; what a page says of itself may need it. */
const catalogueOf = (route: ActivatedRouteSnapshot) => route.data['catalogue'] as Catalogue;
const idOf = (route: ActivatedRouteSnapshot) => route.paramMap.get('id') ?? '';

export const frontRoutes: Routes = [
  {
    path: '',
    data: { head: frontHead },
    resolve: { catalogue: readCatalogue },
    loadComponent: async () => (await import('./front-page')).FrontPage,
  },
];

export const catalogueRoutes: Routes = [
  { path: 'out-of-reach', data: { head: outOfReachHead }, loadComponent: async () => (await import('./out-of-reach-page')).OutOfReachPage },
  {
    path: '',
    resolve: { catalogue: readCatalogue },
    children: [
      {
        path: '',
        pathMatch: 'full',
        data: { head: overviewHead },
        loadComponent: async () => (await import('./catalogue-page')).CataloguePage,
      },
      { path: 'how-a-unit-is-made', data: { head: makingHead }, loadComponent: async () => (await import('./making-page')).MakingPage },
      { path: 'sizes', data: { head: sizesHead }, loadComponent: async () => (await import('./sizes-page')).SizesPage },
      {
        path: 'questions',
        resolve: { head: (route: ActivatedRouteSnapshot) => questionsHead(questionsOf(catalogueOf(route))) },
        loadComponent: async () => (await import('./questions-page')).QuestionsPage,
      },
      { path: 'makers', data: { head: makersHead }, loadComponent: async () => (await import('./makers-page')).MakersPage },
      {
        path: 'makers/:id',
        resolve: { head: (route: ActivatedRouteSnapshot) => makerHead(idOf(route), catalogueOf(route)) },
        loadComponent: async () => (await import('./maker-page')).MakerPage,
      },
      ...catalogueParts.flatMap(({ slug }): Routes => [
        {
          path: slug,
          data: { part: slug },
          resolve: { head: (route: ActivatedRouteSnapshot) => partHead(slug, catalogueOf(route)) },
          loadComponent: async () => (await import('./part-page')).PartPage,
        },
        {
          path: `${slug}/:id`,
          data: { part: slug },
          resolve: { head: (route: ActivatedRouteSnapshot) => itemHead(slug, idOf(route), catalogueOf(route)) },
          loadComponent: async () => (await import('./item-page')).ItemPage,
        },
      ]),
      { path: '**', data: { head: missingHead }, loadComponent: async () => (await import('./missing-page')).MissingPage },
    ],
  },
];
