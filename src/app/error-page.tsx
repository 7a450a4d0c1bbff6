import { isRouteErrorResponse, Link, useLocation, useRevalidator, useRouteError } from 'react-router-dom';
import { ProblemError } from '../api/problem-error.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { PageHeading } from '../ui/page-heading.tsx';
import { NotFoundPage } from './not-found-page.tsx';

/** What stands where a page could not be drawn: what happened in words, and what can be done now. */
export function ErrorPage() {
  const error = useRouteError();
  const status = error instanceof ProblemError || isRouteErrorResponse(error) ? error.status : null;
  if (status === 404) return <NotFoundPage />;
  if (status === 401) return <SignInAgain />;
  if (status === 0 || !navigator.onLine) {
    return (
      <Failure title="The server cannot be reached">
        <p>You may be offline. Nothing is lost: try again when the connection is back.</p>
      </Failure>
    );
  }
  if (error instanceof ProblemError) {
    return (
      <Failure title={error.problem.title}>
        {error.problem.detail !== undefined && <p>{error.problem.detail}</p>}
        {error.problem.requestId !== undefined && (
          <p className="text-ink-2">
            Whoever looks after this instance can find it in the log under{' '}
            <code className="font-sans font-semibold text-ink select-all">{error.problem.requestId}</code>.
          </p>
        )}
      </Failure>
    );
  }
  if (isMissingChunk(error)) {
    return (
      <Failure title="Leeway has been renewed meanwhile">
        <p>This tab still runs the version before. Load it anew to go on.</p>
      </Failure>
    );
  }
  return (
    <Failure title="This page could not be drawn">
      <p>The fault is ours. What you saved is safe.</p>
    </Failure>
  );
}

/** After an update the chunks of the version before are gone from the server. */
function isMissingChunk(error: unknown): boolean {
  return error instanceof TypeError && /module/i.test(error.message) && /import|load/i.test(error.message);
}

function Failure({ title, children }: { title: string; children: React.ReactNode }) {
  const revalidator = useRevalidator();
  return (
    <div role="alert" className="max-w-[40rem]">
      <PageHeading title={title} />
      <div className="mt-4 space-y-3">{children}</div>
      <p className="mt-7 flex flex-wrap gap-3">
        <Button
          kind="primary"
          pending={revalidator.state !== 'idle'}
          onClick={() => window.location.reload()}
        >
          Try again
        </Button>
      </p>
    </div>
  );
}

function SignInAgain() {
  const { pathname, search } = useLocation();
  return (
    <div role="alert" className="max-w-[40rem]">
      <PageHeading title="Sign in first" />
      <p className="mt-4">Your session has ended. Sign in and you come back to this page.</p>
      <p className="mt-7">
        <Link
          to={`${paths.signIn}?${new URLSearchParams({ next: pathname + search }).toString()}`}
          className="text-woad"
        >
          <span className="changeable">Sign in</span>
        </Link>
      </p>
    </div>
  );
}
