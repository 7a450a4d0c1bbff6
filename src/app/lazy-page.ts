import type { QueryClient } from '@tanstack/react-query';
import type { ComponentType } from 'react';
import type { LoaderFunctionArgs, RouteObject } from 'react-router-dom';

type Loader = (args: LoaderFunctionArgs) => unknown;

/** What a page file exports: the page, and what it needs before it can be drawn. */
interface PageModule {
  Component: ComponentType;
  loader?: (client: QueryClient) => Loader;
}

/** A page at its address. */
export type Page = (path: string, load: () => Promise<PageModule>) => RouteObject;

/** Every page is its own chunk, so that the front page stays light. A guard stands before what the page reads. */
export const lazyPage =
  (client: QueryClient, guard?: (client: QueryClient, read: Loader | null) => Loader): Page =>
  (path, load) => ({
    path,
    lazy: async () => {
      const { Component, loader } = await load();
      const read = loader?.(client) ?? null;
      if (guard) return { Component, loader: guard(client, read) };
      return read ? { Component, loader: read } : { Component };
    },
  });
