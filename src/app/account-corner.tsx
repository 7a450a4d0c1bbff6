import { Link, NavLink } from 'react-router-dom';
import type { Me } from '../../shared/me.ts';
import { paths } from '../paths.ts';
import { useSignOut } from './use-sign-out.ts';

/** Who is signed in and the way out; for everybody else the ways in. Nothing while it is not known. */
export function AccountCorner({ me }: { me: Me | undefined }) {
  const signOut = useSignOut();
  if (!me) return null;
  const quiet = 'inline-flex min-h-11 items-center';
  if (!me.user) {
    return (
      <div className="ml-auto flex items-center gap-x-5 text-note md:text-base">
        <Link to={paths.signIn} className={`${quiet} font-medium text-ink-2 hover:text-ink`}>
          Sign in
        </Link>
        <Link to={paths.signUp} className={`${quiet} font-semibold text-woad`}>
          <span className="changeable leading-tight">Make an account</span>
        </Link>
      </div>
    );
  }
  return (
    <div className="ml-auto flex min-w-0 items-center gap-x-5 text-note md:text-base">
      <NavLink
        to={paths.account}
        className={({ isActive }) =>
          `${quiet} min-w-0 no-underline ${isActive ? 'font-semibold text-ink' : 'text-ink-2 hover:text-ink'}`
        }
      >
        <span className="sr-only">Your account: </span>
        <span className="truncate">{me.user.name}</span>
      </NavLink>
      <button
        type="button"
        disabled={signOut.isPending}
        onClick={() => signOut.mutate()}
        className={`${quiet} shrink-0 font-medium text-ink hover:text-woad`}
      >
        {signOut.isError ? 'Sign out again: it failed' : 'Sign out'}
      </button>
    </div>
  );
}
