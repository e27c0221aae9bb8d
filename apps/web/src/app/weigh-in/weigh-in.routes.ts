import type { Routes } from '@angular/router';
import { weighInPageWords } from '@chargewright/wording';
import { WeighInPage } from './weigh-in-page';

export const weighInRoutes: Routes = [{ path: '', component: WeighInPage, title: weighInPageWords.pageTitle }];
