import type { Routes } from '@angular/router';
import { checkPageWords, propertiesWords } from '@chargewright/wording';
import { PropertiesPage } from './properties-page';

const title = `${propertiesWords.title} · ${checkPageWords.shell.product}`;

export const propertiesRoutes: Routes = [
  {
    path: '',
    component: PropertiesPage,
    title,
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'refrigerant' },
      {
        path: 'refrigerant',
        loadComponent: async () => (await import('./refrigerant/refrigerant-properties')).RefrigerantProperties,
        title: `${propertiesWords.refrigerant} · ${title}`,
      },
      {
        path: 'air',
        loadComponent: async () => (await import('./air/air-properties')).AirProperties,
        title: `${propertiesWords.air} · ${title}`,
      },
    ],
  },
];
