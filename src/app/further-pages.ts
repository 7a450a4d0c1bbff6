import type { QueryClient } from '@tanstack/react-query';
import { redirect, type RouteObject } from 'react-router-dom';
import { paths } from '../paths.ts';
import { lazyPage, type Page } from './lazy-page.ts';
import { forAdministrators, forSignedIn } from './session.ts';

/** Every page but the front one, which does without this list. */
export function furtherPages(client: QueryClient): RouteObject[] {
  const page = lazyPage(client);
  return [
    page(paths.signIn, () => import('../account/sign-in-page.tsx')),
    page(paths.signUp, () => import('../account/sign-up-page.tsx')),
    page(paths.forgottenPassword, () => import('../account/forgotten-password-page.tsx')),
    page(paths.newPassword, () => import('../account/new-password-page.tsx')),
    page(paths.confirmAddress, () => import('../account/confirm-address-page.tsx')),
    page(paths.mailbox, () => import('../mailbox/mailbox-page.tsx')),
    page(paths.mailboxMessage(':mailId'), () => import('../mailbox/message-page.tsx')),
    page(paths.interface, () => import('../interface/interface-page.tsx')),
    ...ownPages(lazyPage(client, forSignedIn)),
    ...adminPages(lazyPage(client, forAdministrators)),
  ];
}

/** Pages that belong to whoever is signed in. */
function ownPages(page: Page): RouteObject[] {
  return [
    page(paths.account, () => import('../account/account-page.tsx')),
    page(paths.people, () => import('../people/people-page.tsx')),
    page(paths.newPerson, () => import('../people/new-person-page.tsx')),
    page(paths.person(':personId'), () => import('../people/person-page.tsx')),
    page(paths.editPerson(':personId'), () => import('../people/edit-person-page.tsx')),
    page(paths.measure(':personId'), () => import('../people/measure-page.tsx')),
    page(paths.measurementSet(':personId', ':setId'), () => import('../people/measurement-set-page.tsx')),
    page(paths.patterns, () => import('../patterns/patterns-page.tsx')),
    page(paths.pattern(':patternId'), () => import('../patterns/pattern-page.tsx')),
    page(paths.editPattern(':patternId'), () => import('../patterns/edit-pattern-page.tsx')),
    page(paths.newPattern, () => import('../patterns/new-pattern-page.tsx')),
    page(paths.editTable(':patternId'), () => import('../patterns/edit-table-page.tsx')),
    page(paths.compareRevisions(':patternId'), () => import('../patterns/compare-page.tsx')),
    page(paths.revision(':patternId', ':revisionId'), () => import('../patterns/revision-page.tsx')),
    page(paths.newImport, () => import('../patterns/new-import-page.tsx')),
    page(paths.import(':draftId'), () => import('../patterns/import-page.tsx')),
    page(paths.fit, () => import('../fit/fit-page.tsx')),
    page(paths.plans, () => import('../plans/plans-page.tsx')),
    page(paths.plan(':planId'), () => import('../plans/plan-page.tsx')),
  ];
}

/** Pages for whoever looks after the instance; to everybody else there is nothing there. */
function adminPages(page: Page): RouteObject[] {
  return [
    { path: '/admin', loader: () => redirect(paths.adminPeople) },
    page(paths.adminPeople, () => import('../admin/people-page.tsx')),
    page(paths.adminRequests, () => import('../admin/requests-page.tsx')),
    page(paths.adminMail, () => import('../admin/mail-page.tsx')),
    page(paths.adminLog, () => import('../admin/log-page.tsx')),
    page(paths.adminHealth, () => import('../admin/health-page.tsx')),
    page(paths.adminReference, () => import('../admin/reference-page.tsx')),
  ];
}
