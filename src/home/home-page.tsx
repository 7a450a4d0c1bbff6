import { useQuery } from '@tanstack/react-query';
import { meQuery } from '../account/queries.ts';
import { paths } from '../paths.ts';
import { ButtonLink, TextLink } from '../ui/link.tsx';
import { PageHeading, SectionHeading } from '../ui/page-heading.tsx';
import { DemoPlan } from './demo-plan.tsx';

/** The front page: what Leeway does, a working plan on invented data, and how to begin. */
export function Component() {
  return (
    <>
      <div className="grid items-start gap-x-14 gap-y-3 lg:grid-cols-[minmax(0,1fr)_minmax(0,2fr)]">
        <PageHeading title="Leeway">Know the room before you cut</PageHeading>
        <p className="max-w-[66ch] text-ink-2 lg:pt-1">
          Leeway holds a person’s measurements against a pattern’s size chart and its finished measurements.
          It says which size to cut where, shows the room that leaves at every point, and lets you try another
          size and see at once what it does. Everybody and everything below is invented: take hold of it.
        </p>
      </div>
      <div className="mt-7 border-t-2 border-ink pt-1">
        <div className="border-t-2 border-dashed border-woad pt-7">
          <DemoPlan />
        </div>
      </div>
      <HowToBegin />
    </>
  );
}

const STEPS = [
  {
    title: 'Measure',
    words:
      'Waist, upper bust, bust or chest, and hip are enough to begin; centimetres or inches, as you read them.',
  },
  {
    title: 'Bring the pattern’s tables',
    words:
      'The size chart, the finished measurements, or both, as a CSV file. You see what was understood before it is kept.',
  },
  {
    title: 'Plan',
    words: 'One size, or a blend and where to change line. Saved plans stay as they were when you made them.',
  },
];

function HowToBegin() {
  const { data: me } = useQuery(meQuery);
  const user = me?.user;
  return (
    <section className="mt-16 border-t border-rule pt-8 print:hidden">
      <SectionHeading>{user ? 'Your own' : 'How to begin'}</SectionHeading>
      {!user && (
        <ol className="mt-4 grid list-decimal gap-x-14 gap-y-5 pl-5 marker:font-semibold md:grid-cols-3 md:pl-0 md:[&>li]:ml-5">
          {STEPS.map(({ title, words }) => (
            <li key={title} className="pl-1">
              <p className="font-semibold">{title}</p>
              <p className="max-w-[40ch] text-note text-ink-2">{words}</p>
            </li>
          ))}
        </ol>
      )}
      {user ? (
        <p className="mt-4 flex flex-wrap gap-3">
          <ButtonLink kind="primary" to={paths.fit}>
            Plan a garment
          </ButtonLink>
          <ButtonLink to={paths.people}>People</ButtonLink>
          <ButtonLink to={paths.patterns}>Patterns</ButtonLink>
          <ButtonLink to={paths.plans}>Plans</ButtonLink>
        </p>
      ) : (
        <p className="mt-7 flex flex-wrap items-center gap-x-5 gap-y-3">
          <ButtonLink kind="primary" to={paths.signUp}>
            Make an account
          </ButtonLink>
          <span className="text-ink-2">
            or <TextLink to={paths.signIn}>sign in</TextLink>. Measurements are private: nobody else sees
            them.
          </span>
        </p>
      )}
    </section>
  );
}
