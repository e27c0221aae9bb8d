import type { Routes } from '@angular/router';
import { checkPageWords, looseChecksWords } from '@chargewright/wording';
import { CheckAChargePage } from './check-a-charge/check-a-charge-page';

/** The first page is in the first download: it has to open on a roof. */
export const routes: Routes = [
  { path: '', pathMatch: 'full', component: CheckAChargePage, title: checkPageWords.shell.pageTitle },
  {
    path: 'checks',
    loadComponent: async () => (await import('./layout/checks-page')).ChecksPage,
    title: `${looseChecksWords.title} · ${checkPageWords.shell.product}`,
  },
  {
    path: 'makers-data',
    loadComponent: async () => (await import('./makers-data/makers-data-page')).MakersDataPage,
    title: `${checkPageWords.setup.makersData} · ${checkPageWords.shell.product}`,
  },
  {
    path: 'properties',
    loadChildren: async () => (await import('./properties/properties.routes')).propertiesRoutes,
  },
  {
    path: 'examples',
    loadChildren: async () => (await import('./worked-examples/worked-examples-routes')).workedExamplesRoutes,
  },
  { path: 'airflow', loadChildren: async () => (await import('./airflow/airflow.routes')).airflowRoutes },
  { path: 'weigh-in', loadChildren: async () => (await import('./weigh-in/weigh-in.routes')).weighInRoutes },
  { path: 'sources', loadChildren: async () => (await import('./sources/sources.routes')).sourcesRoutes },
  { path: '**', redirectTo: '' },
];
