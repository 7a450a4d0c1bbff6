import type { InterfaceDocument, Operation } from './document.schema.ts';

/** One route with its address and method. */
export interface DescribedRoute extends Operation {
  method: string;
  path: string;
  /** What a token must be allowed; null where it takes none. */
  scope: string | null;
}

export interface RouteGroup {
  noun: string;
  routes: DescribedRoute[];
}

/** The routes under their nouns, in the description's own order; those that lack a word of `q` are left out. */
export function groupRoutes(document: InterfaceDocument, q = ''): RouteGroup[] {
  const words = q.toLowerCase().split(/\s+/).filter(Boolean);
  const routes = Object.entries(document.paths).flatMap(([path, item]) =>
    Object.entries(item).map(([method, operation]): DescribedRoute => {
      const scope = operation.security.flatMap(({ token }) => token ?? [])[0] ?? null;
      return { ...operation, method: method.toUpperCase(), path, scope };
    }),
  );
  const isAsked = ({ method, path, summary, tags, scope }: DescribedRoute) => {
    const text = `${method} ${path} ${summary} ${tags.join(' ')} ${scope ?? ''}`.toLowerCase();
    return words.every((word) => text.includes(word));
  };
  return document.tags
    .map(({ name }) => ({
      noun: name,
      routes: routes.filter((route) => route.tags[0] === name && isAsked(route)),
    }))
    .filter((group) => group.routes.length > 0);
}
