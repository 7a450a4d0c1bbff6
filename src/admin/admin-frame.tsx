import { Fragment, type ReactNode } from 'react';
import { NavLink } from 'react-router-dom';
import { paths } from '../paths.ts';
import { PageHeading } from '../ui/page-heading.tsx';

const PAGES = [
  { to: paths.adminPeople, word: 'accounts' },
  { to: paths.adminRequests, word: 'requests to teach' },
  { to: paths.adminMail, word: 'mail' },
  { to: paths.adminLog, word: 'the log' },
  { to: paths.adminHealth, word: 'health' },
  { to: paths.adminReference, word: 'reference figures' },
];

interface AdminFrameProps {
  title: string;
  lead: ReactNode;
  children: ReactNode;
}

/** What the pages of the administration share: the way between them, and the heading with what it is about. */
export function AdminFrame({ title, lead, children }: AdminFrameProps) {
  return (
    <>
      <PagesSentence />
      <PageHeading title={title} />
      <p className="mt-2 max-w-[44rem] text-ink-2">{lead}</p>
      {children}
    </>
  );
}

/** The way between the pages as one says it: where one is has the solid line, where one can go the dashed one. */
function PagesSentence() {
  return (
    <nav aria-label="Administration" className="mb-4 text-lead text-ink-2 print:hidden">
      Looking after{' '}
      {PAGES.map(({ to, word }, index) => (
        <Fragment key={to}>
          {index === 0 ? '' : index === PAGES.length - 1 ? ' and ' : ', '}
          <NavLink
            to={to}
            className={({ isActive }) =>
              `inline-block py-1.5 no-underline ${
                isActive ? 'font-semibold text-ink' : 'text-ink-2 hover:text-woad'
              }`
            }
          >
            {({ isActive }) => (
              <span className={isActive ? 'border-b-2 border-ink' : 'changeable'}>{word}</span>
            )}
          </NavLink>
        </Fragment>
      ))}
    </nav>
  );
}

/** What stands where a list has nothing that was asked for. */
export function NothingListed({ children }: { children: ReactNode }) {
  return <p className="mt-6 max-w-[38rem] border-t border-rule pt-5">{children}</p>;
}
