import type { Routes } from '@angular/router';
import { signedIn } from './session/signed-in';

export const appRoutes: Routes = [
  {
    path: 'sign-in',
    title: 'Sign in',
    loadComponent: () => import('./session/sign-in-page').then((m) => m.SignInPage),
  },
  {
    path: '',
    loadComponent: () => import('./shell/shell').then((m) => m.Shell),
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'parts' },
      {
        path: 'parts',
        title: 'Parts',
        canActivate: [signedIn],
        loadComponent: () => import('./parts/register').then((m) => m.Register),
      },
      {
        path: 'parts/new',
        title: 'New part',
        canActivate: [signedIn],
        loadComponent: () => import('./new-part/new-part-page').then((m) => m.NewPartPage),
      },
      {
        path: 'parts/:id',
        title: 'Part',
        canActivate: [signedIn],
        loadComponent: () => import('./part/part-page').then((m) => m.PartPage),
      },
      {
        path: '**',
        title: 'Page not found',
        loadComponent: () => import('./shell/not-found').then((m) => m.NotFound),
      },
    ],
  },
];
