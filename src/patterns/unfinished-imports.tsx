import { useSuspenseQuery } from '@tanstack/react-query';
import { paths } from '../paths.ts';
import { TextLink } from '../ui/link.tsx';
import { SectionHeading } from '../ui/page-heading.tsx';
import { printMoment } from '../ui/moment.ts';
import { draftsQuery } from './queries.ts';
import { sayMaker } from './pattern-words.ts';

/** Imports that were begun and not committed: they wait on the server, so any device can go on with them. */
export function UnfinishedImports() {
  const { data: drafts } = useSuspenseQuery(draftsQuery());
  if (drafts.items.length === 0) return null;
  return (
    <section aria-labelledby="unfinished" className="mt-8 border-l-2 border-dashed border-woad pl-5">
      <SectionHeading id="unfinished">Carry on where you left</SectionHeading>
      <ul className="mt-2">
        {drafts.items.map((draft) => {
          const maker = sayMaker(draft.details);
          return (
            <li key={draft.id} className="flex flex-wrap items-baseline gap-x-4 py-1.5">
              <TextLink to={paths.import(draft.id)} className="font-semibold">
                {draft.details.title?.trim() || 'A pattern without a title yet'}
              </TextLink>
              <span className="text-note text-ink-2">
                {maker !== '' && `${maker} · `}
                {draft.patternId === null ? '' : 'new tables · '}
                last changed {printMoment(draft.updatedAt)}
              </span>
            </li>
          );
        })}
      </ul>
      {drafts.total > drafts.items.length && (
        <p className="mt-1 text-note text-ink-2">
          And {drafts.total - drafts.items.length} older: they show here as these are finished or discarded.
        </p>
      )}
    </section>
  );
}
