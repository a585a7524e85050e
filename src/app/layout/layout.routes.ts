import type { Routes } from '@angular/router';

export const LAYOUT_ROUTES: Routes = [];
