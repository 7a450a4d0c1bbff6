import { useQuery } from '@tanstack/react-query';
import { useRef, type ReactNode } from 'react';
import { Link, NavLink, Outlet, ScrollRestoration } from 'react-router-dom';
import { meQuery } from '../account/queries.ts';
import { paths } from '../paths.ts';
import { Skeleton } from '../ui/skeleton.tsx';
import { AccountCorner } from './account-corner.tsx';
import { PendingLine } from './pending-line.tsx';
import { useHeadingFocus } from './use-heading-focus.ts';

const SECTIONS = [
  { to: paths.people, word: 'People' },
  { to: paths.patterns, word: 'Patterns' },
  { to: paths.plans, word: 'Plans' },
];
const ADMIN_SECTION = { to: '/admin', word: 'Admin' };

/** The frame of every page: the wordmark, where one can go, who is here, and the page itself. */
export function Layout() {
  const main = useRef<HTMLElement>(null);
  useHeadingFocus(main);
  return (
    <>
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:absolute focus:top-2 focus:left-2 focus:z-20 focus:bg-paper focus:px-3 focus:py-2"
        onClick={(event) => {
          event.preventDefault();
          main.current?.focus();
        }}
      >
        Skip to the page
      </a>
      <PendingLine />
      <Frame mainRef={main}>
        <Outlet />
      </Frame>
      <ScrollRestoration />
    </>
  );
}

/** What stands while the very first page is on its way. */
export function FirstLoad() {
  return (
    <Frame>
      <Skeleton />
    </Frame>
  );
}

function Frame({ children, mainRef }: { children: ReactNode; mainRef?: React.Ref<HTMLElement> }) {
  const { data: me } = useQuery(meQuery);
  const user = me?.user;
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="border-b border-rule print:hidden">
        <div className="mx-auto flex min-h-17 max-w-[90rem] items-center gap-x-9 px-5 md:min-h-19 md:px-8 xl:px-14">
          <Wordmark />
          {user && <Sections isAdmin={user.role === 'admin'} className="hidden gap-x-7 md:flex" />}
          <AccountCorner me={me} />
        </div>
      </header>
      <main
        id="main"
        ref={mainRef}
        tabIndex={-1}
        className="mx-auto w-full max-w-[90rem] grow px-5 pt-7 pb-20 md:px-8 md:pt-9 xl:px-14 print:p-0"
      >
        {children}
      </main>
      {user && (
        <Sections
          isAdmin={user.role === 'admin'}
          className="sticky bottom-0 z-10 grid auto-cols-fr grid-flow-col border-t border-rule bg-paper pb-[env(safe-area-inset-bottom)] md:hidden"
          onPhone
        />
      )}
    </div>
  );
}

/** The word over the two lines that the whole product is about: the body's, and the cloth's. */
function Wordmark() {
  return (
    <Link to={paths.home} aria-label="Leeway, front page" className="inline-block py-2 no-underline">
      <span className="block text-[1.375rem] leading-none font-bold tracking-[-0.01em]">Leeway</span>
      <span aria-hidden="true" className="mt-2 block border-t-2 border-ink" />
      <span aria-hidden="true" className="mt-1 block border-t-2 border-dashed border-woad" />
    </Link>
  );
}

function Sections({
  className,
  isAdmin,
  onPhone = false,
}: {
  className: string;
  isAdmin: boolean;
  onPhone?: boolean;
}) {
  const shape = onPhone
    ? 'flex min-h-13 items-center justify-center border-t-3 -mt-px text-note'
    : 'flex min-h-11 items-center border-b-2 border-t-2 border-t-transparent';
  return (
    <nav aria-label="Main" className={`${className} print:hidden`}>
      {(isAdmin ? [...SECTIONS, ADMIN_SECTION] : SECTIONS).map(({ to, word }) => (
        <NavLink
          key={to}
          to={to}
          className={({ isActive }) =>
            `${shape} font-medium no-underline ${
              isActive ? 'border-ink text-ink' : 'border-transparent text-ink-2 hover:text-ink'
            }`
          }
        >
          {word}
        </NavLink>
      ))}
    </nav>
  );
}
