import type { Pattern } from '../../shared/patterns/patterns.schema.ts';
import { capital, listWords, sayPoint } from '../../shared/fit/say-words.ts';
import { POINT_IDS } from '../../shared/points/point-ids.ts';
import { Notice } from '../ui/notice.tsx';
import { sayKind, sayPublished, sayPublishedMeaning, saySizes } from './pattern-words.ts';
import { SizesMark } from './sizes-mark.tsx';

/** What is known of a pattern beside its tables, said rather than listed where it can be. */
export function PatternFacts({ pattern }: { pattern: Pattern }) {
  const edges = sayEdges(pattern);
  return (
    <div className="mt-4 grid gap-x-14 gap-y-6 lg:grid-cols-[minmax(0,42rem)_minmax(0,1fr)]">
      <div className="space-y-3">
        <p className="text-lead">
          {capital(sayKind(pattern))}
          {pattern.worn === 'open' ? ', worn open' : ''}. {capital(saySizes(pattern.sizes))}.
        </p>
        {pattern.cloth !== '' && <p className="text-ink-2">Meant for {pattern.cloth}.</p>}
        {edges !== '' && <p className="text-ink-2">{edges}</p>}
        {pattern.notes !== '' && <p className="whitespace-pre-line text-ink-2">{pattern.notes}</p>}
        {pattern.structure === 'knit' && (
          <Notice>
            <p>Knits are not reckoned yet: a plan will say that it cannot judge the stretch.</p>
          </Notice>
        )}
      </div>
      <div>
        <SizesMark {...pattern} />
        <p className="mt-2 font-semibold">{sayPublished(pattern)}</p>
        <p className="max-w-[30rem] text-note text-ink-2">{sayPublishedMeaning(pattern)}</p>
      </div>
    </div>
  );
}

/** “Seam edges: 4 at the bust, waist and hip, 2 at the upper arm.” */
function sayEdges({ seamEdges }: Pattern): string {
  const byCount = new Map<number, string[]>();
  for (const point of POINT_IDS) {
    const edges = seamEdges[point];
    if (edges !== undefined) byCount.set(edges, [...(byCount.get(edges) ?? []), sayPoint(point, 'bust')]);
  }
  if (byCount.size === 0) return '';
  return `Seam edges: ${[...byCount].map(([edges, points]) => `${edges} at the ${listWords(points)}`).join('; ')}.`;
}
