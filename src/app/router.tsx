import type { QueryClient } from '@tanstack/react-query';
import type { ComponentType } from 'react';
import { createBrowserRouter, type LoaderFunctionArgs, type RouteObject } from 'react-router-dom';
import { paths } from '../paths.ts';
import { ErrorPage } from './error-page.tsx';
import { FirstLoad, Layout } from './layout.tsx';
import { NotFoundPage } from './not-found-page.tsx';
import { forSignedIn } from './session.ts';

/** What a page file exports: the page, and what it needs before it can be drawn. */
interface PageModule {
  Component: ComponentType;
  loader?: (client: QueryClient) => (args: LoaderFunctionArgs) => unknown;
}

type Page = (path: string, load: () => Promise<PageModule>) => RouteObject;

export function createRouter(client: QueryClient) {
  /** Every page is its own chunk, so that the front page stays light. */
  const page: Page = (path, load) => ({
    path,
    lazy: async () => {
      const { Component, loader } = await load();
      return loader ? { Component, loader: loader(client) } : { Component };
    },
  });
  const ownPage: Page = (path, load) => ({
    path,
    lazy: async () => {
      const { Component, loader } = await load();
      return { Component, loader: forSignedIn(client, loader?.(client) ?? null) };
    },
  });

  return createBrowserRouter([
    {
      Component: Layout,
      HydrateFallback: FirstLoad,
      ErrorBoundary: ErrorPage,
      children: [
        {
          ErrorBoundary: ErrorPage,
          children: [
            page(paths.home, () => import('../home/home-page.tsx')),
            page(paths.signIn, () => import('../account/sign-in-page.tsx')),
            page(paths.signUp, () => import('../account/sign-up-page.tsx')),
            ...ownPages(ownPage),
            { path: '*', Component: NotFoundPage },
          ],
        },
      ],
    },
  ]);
}

/** Pages that belong to whoever is signed in. */
function ownPages(page: Page): RouteObject[] {
  return [
    page(paths.people, () => import('../people/people-page.tsx')),
    page(paths.newPerson, () => import('../people/new-person-page.tsx')),
    page(paths.person(':personId'), () => import('../people/person-page.tsx')),
    page(paths.editPerson(':personId'), () => import('../people/edit-person-page.tsx')),
    page(paths.measure(':personId'), () => import('../people/measure-page.tsx')),
    page(paths.measurementSet(':personId', ':setId'), () => import('../people/measurement-set-page.tsx')),
    page(paths.patterns, () => import('../patterns/patterns-page.tsx')),
    page(paths.pattern(':patternId'), () => import('../patterns/pattern-page.tsx')),
    page(paths.editPattern(':patternId'), () => import('../patterns/edit-pattern-page.tsx')),
    page(paths.revision(':patternId', ':revisionId'), () => import('../patterns/revision-page.tsx')),
    page(paths.newImport, () => import('../patterns/new-import-page.tsx')),
    page(paths.import(':draftId'), () => import('../patterns/import-page.tsx')),
    page(paths.fit, () => import('../fit/fit-page.tsx')),
    page(paths.plans, () => import('../plans/plans-page.tsx')),
    page(paths.plan(':planId'), () => import('../plans/plan-page.tsx')),
  ];
}
