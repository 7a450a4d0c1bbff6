import { useQuery } from '@tanstack/react-query';
import { measurementSetQuery, peopleQuery, personQuery } from '../people/queries.ts';
import { patternQuery, revisionQuery } from '../patterns/queries.ts';
import { paths } from '../paths.ts';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { Setting } from './parts/setting.tsx';
import { MeasuredWord, PatternWord, PersonWord } from './setting-choosers.tsx';

/** The sentence with its blanks: until both are chosen there is nothing to answer. */
export function ChooseFirst({ setId, revisionId }: { setId: string | null; revisionId: string | null }) {
  const { data: people } = useQuery(peopleQuery());
  const { data: set } = useQuery({ ...measurementSetQuery(setId ?? ''), enabled: setId !== null });
  const { data: person } = useQuery({ ...personQuery(set?.personId ?? ''), enabled: set !== undefined });
  const { data: revision } = useQuery({ ...revisionQuery(revisionId ?? ''), enabled: revisionId !== null });
  const { data: pattern } = useQuery({
    ...patternQuery(revision?.patternId ?? ''),
    enabled: revision !== undefined,
  });
  const nobodyMeasured = people?.items.every((each) => each.latestSetId === null) ?? false;
  const first = people?.items[0];
  return (
    <>
      <PageHeading title="A new plan" />
      {nobodyMeasured && first ? (
        <div className="mt-5 max-w-[40rem] space-y-5">
          <p className="text-lead">
            {first.name} has not been measured yet; a plan needs at least one girth.
          </p>
          <ButtonLink kind="primary" to={paths.measure(first.id)}>
            Measure {first.name}
          </ButtonLink>
        </div>
      ) : (
        <>
          <div className="mt-5">
            <Setting>
              <PersonWord person={person ?? null} />
              {set && (
                <>
                  , measured <MeasuredWord set={set} />
                </>
              )}
              , in the <PatternWord pattern={pattern ?? null} />
            </Setting>
          </div>
          <p className="mt-6 max-w-[52ch] text-ink-2">
            Choose the words with the dashed line. Somebody or something missing? Add{' '}
            <TextLink to={paths.newPerson}>a person</TextLink> or{' '}
            <TextLink to={paths.newImport}>a pattern</TextLink>.
          </p>
        </>
      )}
    </>
  );
}
