import type { ReactNode } from 'react';
import { Table, Td, Th } from '../ui/table.tsx';
import { curlOf } from './curl-of.ts';
import type { InterfaceDocument } from './document.schema.ts';
import type { DescribedRoute } from './routes-of.ts';
import { sayKind } from './say-schema.ts';
import { SchemaView } from './schema-view.tsx';

const WHO: Record<DescribedRoute['x-who'], string> = {
  anyone: 'Anyone, signed in or not',
  member: 'Whoever has an account, for what is theirs',
  teacher: 'Teachers and administrators',
  admin: 'Administrators',
};

/** One route, folded: opened it says who may, what it takes and what it answers. */
export function RouteView({ route, document }: { route: DescribedRoute; document: InterfaceDocument }) {
  const { operationId, method, path, summary } = route;
  return (
    <details className="border-b border-rule">
      <summary
        id={operationId}
        className="grid min-h-11 items-baseline gap-x-6 py-2.5 md:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]"
      >
        <span>
          <span className="changeable font-medium">{summary}</span>
        </span>
        <span className="text-note text-ink-2 [overflow-wrap:anywhere]">
          {method} <span className="text-ink">{path}</span>
        </span>
      </summary>
      <RouteBody route={route} document={document} />
    </details>
  );
}

function RouteBody({ route, document }: { route: DescribedRoute; document: InterfaceDocument }) {
  const { scope, parameters, requestBody, responses, operationId } = route;
  const curl = curlOf(route, document.components.schemas, window.location.origin);
  return (
    <div className="grid gap-x-14 gap-y-5 pt-2 pb-8 text-note lg:grid-cols-2">
      <div className="min-w-0 space-y-5">
        <Part name="Who may">
          <p>{WHO[route['x-who']]}</p>
          <p className="text-ink-2">
            {scope !== null
              ? `A token needs the scope ${scope}.`
              : route['x-who'] === 'anyone'
                ? 'No token is asked for.'
                : 'From a signed-in browser only; a token is refused.'}
          </p>
        </Part>
        {parameters.length > 0 && <Parameters route={route} />}
        {Object.entries(requestBody?.content ?? {}).map(([mediaType, { schema }]) => (
          <Part key={mediaType} name={`Sent, as ${mediaType}`}>
            {schema === undefined ? <p>The bytes themselves.</p> : <SchemaView schema={schema} />}
          </Part>
        ))}
        {curl !== null && (
          <Part name="From a shell">
            <pre
              tabIndex={0}
              role="group"
              aria-label={`curl for ${operationId}`}
              className="bg-woad-tint px-4 py-3 font-sans leading-relaxed [overflow-wrap:anywhere] whitespace-pre-wrap"
            >
              {curl}
            </pre>
          </Part>
        )}
      </div>
      <div className="min-w-0 space-y-2">
        {Object.entries(responses).map(([status, { description, content = {} }]) => (
          <div key={status}>
            <p>
              <span className="font-semibold">{status}</span>{' '}
              <span className="text-ink-2">{description.replaceAll('`', '')}</span>
            </p>
            {Number(status) < 400 &&
              Object.entries(content).map(([mediaType, { schema }]) => (
                <div key={mediaType}>
                  {schema === undefined ? <p>{mediaType}</p> : <SchemaView schema={schema} />}
                </div>
              ))}
          </div>
        ))}
      </div>
    </div>
  );
}

function Part({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div>
      <p className="font-semibold">{name}</p>
      {children}
    </div>
  );
}

const PLACES: Record<string, string> = { path: 'in the address', query: 'after the ?' };

function Parameters({ route: { parameters, operationId } }: { route: DescribedRoute }) {
  return (
    <Table label={`Parameters of ${operationId}`} className="max-w-[34rem]">
      <thead>
        <tr>
          <Th>Parameter</Th>
          <Th>Value</Th>
        </tr>
      </thead>
      <tbody>
        {parameters.map((parameter) => (
          <tr key={`${parameter.in} ${parameter.name}`}>
            <Td className="py-2">
              <span className="font-semibold">{parameter.name}</span>{' '}
              <span className="text-ink-2">{PLACES[parameter.in] ?? parameter.in}</span>
            </Td>
            <Td className="py-2 [overflow-wrap:anywhere]">
              {sayKind(parameter.schema)}
              {!parameter.required && ', may be left out'}
            </Td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
