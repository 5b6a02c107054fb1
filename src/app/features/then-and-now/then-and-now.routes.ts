import type { Routes } from '@angular/router';
import { ThenAndNowPage } from './then-and-now-page';

export const THEN_AND_NOW_ROUTES: Routes = [{ path: '', component: ThenAndNowPage, title: 'Then and now' }];
