import type { PatternSummary } from '../../shared/patterns/patterns.schema.ts';
import { capital } from '../../shared/fit/say-words.ts';
import { paths } from '../paths.ts';
import { TextLink } from '../ui/link.tsx';
import { sayKind, sayMaker, sayPublished, saySizes } from './pattern-words.ts';
import { PublishedMark } from './published-mark.tsx';

/** A pattern in the list, on one line where there is room for one. */
export function PatternRow({ pattern }: { pattern: PatternSummary }) {
  const maker = sayMaker(pattern);
  return (
    <li className="grid gap-x-8 gap-y-1 border-b border-rule py-4 md:grid-cols-[minmax(0,5fr)_minmax(0,4fr)_minmax(0,5fr)] md:items-baseline">
      <div>
        <TextLink to={paths.pattern(pattern.id)} className="text-lead font-semibold">
          {pattern.title}
        </TextLink>
        {maker !== '' && <p className="text-note text-ink-2">{maker}</p>}
      </div>
      <p>
        {capital(sayKind(pattern))}
        <span className="block text-note text-ink-2">{saySizes(pattern.sizes)}</span>
      </p>
      <div className="flex items-center gap-3 text-note">
        <PublishedMark hasChart={pattern.hasChart} hasFinished={pattern.hasFinished} />
        <span>{sayPublished(pattern)}</span>
      </div>
    </li>
  );
}
