import type { ProblemName } from '../../shared/problem.ts';
import type { RouteDescription } from '../http/describe.ts';

/** How a route may refuse: what follows from its description, and what it names itself. */
export function problemsOf(method: string, path: string, route: RouteDescription): ProblemName[] {
  const { who, body, query, problems = [] } = route;
  const isJson = body !== undefined && !('fileField' in body);
  const isFile = body !== undefined && !isJson;
  const follows: [ProblemName, boolean][] = [
    ['malformed', isJson || isFile],
    ['signedOut', who !== 'anyone'],
    ['foreignOrigin', method !== 'GET'],
    ['forbidden', who === 'teacher' || who === 'admin'],
    ['outsideScope', who !== 'anyone'],
    ['notFound', path.includes(':')],
    ['tooLarge', isJson || isFile],
    ['unsupported', isJson || isFile],
    ['invalid', isJson || isFile || query !== undefined],
    ['failed', true],
    // Where a route answers 503 in its own words, that is what is described.
    ['unavailable', !Object.hasOwn(route.answers, 503)],
  ];
  return [...new Set([...follows.filter(([, does]) => does).map(([name]) => name), ...problems])];
}
