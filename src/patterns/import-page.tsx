import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { ImportDraft } from '../../shared/patterns/imports.schema.ts';
import { paths } from '../paths.ts';
import { TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { param } from '../ui/param.ts';
import { ImportForm } from './import/import-form.tsx';
import { draftQuery } from './queries.ts';

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) =>
    client.query(draftQuery(param(params, 'draftId')));

export function Component() {
  const draftId = param(useParams(), 'draftId');
  const { data: draft } = useSuspenseQuery(draftQuery(draftId));
  return (
    <>
      <ImportHeading draft={draft} />
      <p className="mt-3 max-w-[42rem] text-ink-2">
        {draft.patternId === null
          ? 'One table is enough; with both, the room the draft gives is known. '
          : 'They become the pattern’s next revision, which has the tables brought here and no others: bring both again if the pattern has both. The revision before stays, and so do the plans made with it. '}
        Everything is kept as you go, half done too: come back to it any time, on any device.
      </p>
      <ImportForm key={draft.id} draft={draft} />
    </>
  );
}

function ImportHeading({ draft }: { draft: ImportDraft }) {
  if (draft.patternId === null) {
    return <PageHeading title="Add a pattern" above={<TextLink to={paths.patterns}>Patterns</TextLink>} />;
  }
  const title = draft.details.title ?? '';
  return (
    <PageHeading
      title={title === '' ? 'New tables' : `New tables for ${title}`}
      above={<TextLink to={paths.pattern(draft.patternId)}>{title === '' ? 'The pattern' : title}</TextLink>}
    />
  );
}
