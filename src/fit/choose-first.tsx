import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { measurementSetQuery, peopleQuery, personQuery } from '../people/queries.ts';
import { patternQuery, patternsQuery, revisionQuery } from '../patterns/queries.ts';
import { paths } from '../paths.ts';
import { printDay } from '../ui/day.ts';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { PageHeading, SectionHeading } from '../ui/page-heading.tsx';
import { Setting, WithComma } from './parts/setting.tsx';
import { MeasuredWord, PatternWord, PersonWord } from './setting-choosers.tsx';

interface ChooseFirstProps {
  setId: string | null;
  revisionId: string | null;
}

/** The sentence with its blanks: until both are chosen there is nothing to answer. */
export function ChooseFirst({ setId, revisionId }: ChooseFirstProps) {
  const { data: set } = useQuery({ ...measurementSetQuery(setId ?? ''), enabled: setId !== null });
  const { data: person } = useQuery({ ...personQuery(set?.personId ?? ''), enabled: set !== undefined });
  const { data: revision } = useQuery({ ...revisionQuery(revisionId ?? ''), enabled: revisionId !== null });
  const { data: pattern } = useQuery({
    ...patternQuery(revision?.patternId ?? ''),
    enabled: revision !== undefined,
  });
  return (
    <>
      <PageHeading title="A new plan" />
      <div className="mt-5">
        <Setting>
          A plan for{' '}
          <WithComma>
            <PersonWord person={person ?? null} />
          </WithComma>{' '}
          {set && (
            <>
              measured{' '}
              <WithComma>
                <MeasuredWord set={set} />
              </WithComma>{' '}
            </>
          )}
          in {pattern ? 'the ' : ''}
          <PatternWord pattern={pattern ?? null} />
        </Setting>
      </div>
      <div className="mt-9 grid gap-x-14 gap-y-10 md:grid-cols-2">
        {setId === null && <Who />}
        {revisionId === null && <WhichPattern />}
      </div>
    </>
  );
}

const ROW = 'flex min-h-13 flex-wrap items-center justify-between gap-x-6 border-b border-rule py-1.5';
const NAME =
  'inline-flex min-h-11 items-center font-semibold decoration-1 underline-offset-4 hover:text-woad hover:underline';

function Who() {
  const { data: people } = useSuspenseQuery(peopleQuery());
  const [search] = useSearchParams();
  return (
    <section>
      <SectionHeading>Who is it for?</SectionHeading>
      <ul className="mt-3 border-t border-rule">
        {people.items.map((person) => (
          <li key={person.id} className={ROW}>
            {person.latestSetId === null ? (
              <>
                <span className="font-semibold text-ink-2">{person.name}</span>
                <ButtonLink kind="quiet" to={paths.measure(person.id)} aria-label={`Measure ${person.name}`}>
                  Measure first
                </ButtonLink>
              </>
            ) : (
              <>
                <Link to={withParam(search, 'set', person.latestSetId)} className={NAME}>
                  {person.name}
                </Link>
                {person.latestTakenOn !== null && (
                  <span className="text-note text-ink-2">measured {printDay(person.latestTakenOn)}</span>
                )}
              </>
            )}
          </li>
        ))}
      </ul>
      <p className="mt-4 text-note text-ink-2">
        Somebody else? <TextLink to={paths.newPerson}>Add a person</TextLink>
      </p>
    </section>
  );
}

function WhichPattern() {
  const { data: patterns } = useSuspenseQuery(patternsQuery());
  const [search] = useSearchParams();
  return (
    <section>
      <SectionHeading>In which pattern?</SectionHeading>
      <ul className="mt-3 border-t border-rule">
        {patterns.items.map((pattern) => (
          <li key={pattern.id} className={ROW}>
            <Link to={withParam(search, 'revision', pattern.latestRevisionId)} className={NAME}>
              {pattern.title}
            </Link>
            <span className="text-note text-ink-2">
              {pattern.structure === 'knit' ? 'for a knit: not reckoned yet' : pattern.maker}
            </span>
          </li>
        ))}
      </ul>
      <p className="mt-4 text-note text-ink-2">
        Another one? <TextLink to={paths.newImport}>Bring its tables</TextLink>
      </p>
    </section>
  );
}

function withParam(search: URLSearchParams, name: string, value: string): string {
  const next = new URLSearchParams(search);
  next.set(name, value);
  return `${paths.fit}?${next.toString()}`;
}
