import type { ActivatedRouteSnapshot, Routes } from '@angular/router';
import { findWorkedExample } from '@chargewright/engine/training';
import { checkPageWords, workedExampleStories, workedExampleWords } from '@chargewright/wording';

const { list, example, key } = workedExampleWords;

const titled = (title: string): string => `${title} · ${checkPageWords.shell.product}`;

/** Titles carry no figures, so any unit system will do. */
const storyTitle = ({ paramMap }: ActivatedRouteSnapshot): string => {
  const found = findWorkedExample(paramMap.get('id') ?? '');
  return found === undefined ? example.unknownTitle : workedExampleStories('F-psi')[found.id].title;
};

export const workedExamplesRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    loadComponent: async () => (await import('./examples-page')).ExamplesPage,
    title: titled(list.title),
  },
  {
    path: ':id',
    loadComponent: async () => (await import('./example-page')).ExamplePage,
    title: (route) => titled(storyTitle(route)),
  },
  {
    path: ':id/key',
    loadComponent: async () => (await import('./key-page')).KeyPage,
    title: (route) => titled(key.title(storyTitle(route))),
  },
];
