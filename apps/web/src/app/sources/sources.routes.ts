import type { Routes } from '@angular/router';
import { checkPageWords, sourcesWords } from '@chargewright/wording';
import { SourcesPage } from './sources-page';

export const sourcesRoutes: Routes = [
  { path: '', component: SourcesPage, title: `${sourcesWords.title} · ${checkPageWords.shell.product}` },
];
