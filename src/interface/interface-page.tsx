import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useLocation, useSearchParams } from 'react-router-dom';
import { paths } from '../paths.ts';
import { JumpLink, jumpTo } from '../ui/jump-link.tsx';
import { TextLink } from '../ui/link.tsx';
import { PageHeading, SectionHeading } from '../ui/page-heading.tsx';
import { readListAddress } from '../ui/pagination.tsx';
import { SearchBox } from '../ui/search-box.tsx';
import type { InterfaceDocument } from './document.schema.ts';
import { interfaceQuery } from './queries.ts';
import { RouteView } from './route-view.tsx';
import { groupRoutes, type RouteGroup } from './routes-of.ts';
import { SchemaView, shapeId } from './schema-view.tsx';

export const loader = (client: QueryClient) => () => client.query(interfaceQuery);

/** What scripts may ask of Leeway: the server's own description, to be read by people. */
export function Component() {
  const { data } = useSuspenseQuery(interfaceQuery);
  const [search] = useSearchParams();
  const { q } = readListAddress(`?${search.toString()}`);
  const groups = groupRoutes(data, q);
  const count = groups.reduce((sum, { routes }) => sum + routes.length, 0);
  const { hash } = useLocation();
  useEffect(() => {
    if (hash === '') return;
    // After the router has put the page at its top.
    const frame = requestAnimationFrame(() => jumpTo(decodeURIComponent(hash.slice(1))));
    return () => cancelAnimationFrame(frame);
  }, [hash]);
  return (
    <>
      <PageHeading title="The interface for scripts" />
      <Introduction document={data} />
      <div className="mt-10 flex flex-wrap items-end gap-x-10 gap-y-5">
        <SearchBox label="Find a route" />
        <p role="status" className="pb-2 text-lead text-ink-2">
          {count === 1 ? '1 route' : `${count} routes`}
        </p>
      </div>
      {groups.length > 1 && <Nouns groups={groups} />}
      {groups.length === 0 && (
        <p className="mt-6 border-t border-rule pt-5">
          No route has these words. <TextLink to={paths.interface}>Show all</TextLink>
        </p>
      )}
      {groups.map(({ noun, routes }) => (
        <section key={noun} aria-labelledby={nounId(noun)} className="mt-11">
          <h2 id={nounId(noun)} tabIndex={-1} className="text-section font-semibold">
            {noun}
          </h2>
          <div className="mt-2 border-t border-rule">
            {routes.map((route) => (
              <RouteView key={route.operationId} route={route} document={data} />
            ))}
          </div>
        </section>
      ))}
      <Shapes document={data} />
    </>
  );
}

const nounId = (noun: string) => `noun-${noun.toLowerCase().replace(/\W+/g, '-')}`;

function Introduction({ document: { info } }: { document: InterfaceDocument }) {
  return (
    <div className="mt-3 max-w-[46rem] space-y-3">
      <p>
        Whatever the pages do, a script or a spreadsheet can do too: import patterns, write down measurements,
        reckon plans. Make a token under <TextLink to={`${paths.account}#tokens`}>your account</TextLink> and
        send it along:
      </p>
      <pre
        tabIndex={0}
        role="group"
        aria-label="An example with curl"
        className="bg-woad-tint px-4 py-3 font-sans text-note leading-relaxed [overflow-wrap:anywhere] whitespace-pre-wrap"
      >
        {`LEEWAY_TOKEN=the-token-you-made\ncurl -H "Authorization: Bearer $LEEWAY_TOKEN" '${window.location.origin}/api/people'`}
      </pre>
      {info.description.split('\n\n').map((paragraph) => (
        <p key={paragraph} className="text-note text-ink-2">
          {paragraph.replaceAll('`', '')}
        </p>
      ))}
      <p className="text-note text-ink-2">
        Version {info.version}. The same for programs:{' '}
        <a href="/api/openapi.json" className="text-woad underline decoration-1 underline-offset-4">
          openapi.json
        </a>
        , OpenAPI 3.1.
      </p>
    </div>
  );
}

function Nouns({ groups }: { groups: readonly RouteGroup[] }) {
  return (
    <nav aria-label="Nouns" className="mt-6 flex flex-wrap gap-x-6 gap-y-1">
      {groups.map(({ noun }) => (
        <JumpLink key={noun} to={nounId(noun)} className="inline-flex min-h-11 items-center text-woad">
          {noun}
        </JumpLink>
      ))}
    </nav>
  );
}

function Shapes({ document }: { document: InterfaceDocument }) {
  return (
    <section aria-labelledby="shapes" className="mt-14 border-t-2 border-ink pt-5">
      <SectionHeading id="shapes">Shapes</SectionHeading>
      <p className="mt-1 text-note text-ink-2">What is sent and answered, under the names used above.</p>
      <div className="mt-3 border-t border-rule">
        {Object.entries(document.components.schemas).map(([name, schema]) => (
          <details key={name} className="border-b border-rule">
            <summary id={shapeId(name)} className="flex min-h-11 items-center py-2">
              <span className="changeable font-semibold [overflow-wrap:anywhere]">{name}</span>
            </summary>
            <div className="pb-6 text-note">
              <SchemaView schema={schema} />
            </div>
          </details>
        ))}
      </div>
    </section>
  );
}
