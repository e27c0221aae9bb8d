import type { Routes } from '@angular/router';
import { airflowPageWords } from '@chargewright/wording';
import { AirflowPage } from './airflow-page';

export const airflowRoutes: Routes = [{ path: '', component: AirflowPage, title: airflowPageWords.pageTitle }];
