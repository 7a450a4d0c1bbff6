import type { QueryClient } from '@tanstack/react-query';
import { createBrowserRouter } from 'react-router-dom';
import { paths } from '../paths.ts';
import { ErrorPage } from './error-page.tsx';
import { FirstLoad, Layout } from './layout.tsx';
import { lazyPage } from './lazy-page.ts';
import { NotFoundPage } from './not-found-page.tsx';

const WITHIN_FRAME = 'within-frame';

export function createRouter(client: QueryClient) {
  let hasAll = false;
  return createBrowserRouter(
    [
      {
        Component: Layout,
        HydrateFallback: FirstLoad,
        ErrorBoundary: ErrorPage,
        children: [
          {
            id: WITHIN_FRAME,
            ErrorBoundary: ErrorPage,
            children: [
              lazyPage(client)(paths.home, () => import('../home/home-page.tsx')),
              { path: '*', Component: NotFoundPage },
            ],
          },
        ],
      },
    ],
    {
      /** The list of the other pages comes with the first step beyond the front page. */
      async patchRoutesOnNavigation({ patch }) {
        if (hasAll) return;
        const { furtherPages } = await import('./further-pages.ts');
        patch(WITHIN_FRAME, furtherPages(client));
        hasAll = true;
      },
    },
  );
}
