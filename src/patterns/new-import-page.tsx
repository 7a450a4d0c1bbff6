import type { QueryClient } from '@tanstack/react-query';
import { redirect, type LoaderFunctionArgs } from 'react-router-dom';
import { paths } from '../paths.ts';
import { PageHeading } from '../ui/page-heading.tsx';
import { draftQuery, draftsQuery, startImport } from './queries.ts';

/**
 * Starts a draft on the server and goes there: nothing is typed that only this tab knows. A draft that was begun and
 * never touched is taken up again, so that looking in twice does not leave two. `?pattern=…`: new tables for that one.
 */
export const loader =
  (client: QueryClient) =>
  async ({ request }: LoaderFunctionArgs) => {
    const patternId = new URL(request.url).searchParams.get('pattern');
    const drafts = await client.query({ ...draftsQuery(), staleTime: 0 });
    const untouched = drafts.items.find(
      (draft) => draft.patternId === patternId && draft.updatedAt === draft.createdAt,
    );
    if (untouched) return redirect(paths.import(untouched.id));
    const draft = await startImport(patternId === null ? {} : { patternId });
    client.setQueryData(draftQuery(draft.id).queryKey, draft);
    await client.invalidateQueries({ queryKey: ['imports', 'list'] });
    return redirect(paths.import(draft.id));
  };

/** Never seen: the loader always goes on. */
export function Component() {
  return <PageHeading title="Add a pattern" />;
}
