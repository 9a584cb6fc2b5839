import type { Routes } from '@angular/router';
import { signedOut } from '@seamwright/identity/data-access/session';

const choosePassword = () => import('./choose-password.page').then((m) => m.ChoosePasswordPage);

/** The pages of those who are not signed in; the addresses of the last two stand in mails. */
export const signInRoutes: Routes = [
  {
    path: 'sign-in',
    title: $localize`:@@identity.signIn.title:Sign in`,
    canActivate: [signedOut],
    loadComponent: () => import('./sign-in.page').then((m) => m.SignInPage),
  },
  {
    path: 'forgotten-password',
    title: $localize`:@@identity.forgotten.title:Forgotten password`,
    loadComponent: () => import('./forgotten-password.page').then((m) => m.ForgottenPasswordPage),
  },
  {
    path: 'accept-invitation',
    title: $localize`:@@identity.accept.title:Accept your invitation`,
    data: { link: 'invitation' },
    loadComponent: choosePassword,
  },
  {
    path: 'set-password',
    title: $localize`:@@identity.setPassword.title:Set a new password`,
    data: { link: 'password-reset' },
    loadComponent: choosePassword,
  },
];
