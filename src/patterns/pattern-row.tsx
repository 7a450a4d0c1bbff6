import { capital } from '../../shared/fit/say-words.ts';
import type { PatternSummary } from '../../shared/patterns/patterns.schema.ts';
import { paths } from '../paths.ts';
import { TextLink } from '../ui/link.tsx';
import { sayKind, sayMaker, sayPublished, saySizes } from './pattern-words.ts';
import { SizesMark } from './sizes-mark.tsx';

/** A pattern in the list, on one line where there is room for one. */
export function PatternRow({ pattern }: { pattern: PatternSummary }) {
  const maker = sayMaker(pattern);
  return (
    <li className="grid gap-x-8 gap-y-2 border-b border-rule py-4 md:grid-cols-[minmax(0,5fr)_minmax(0,7fr)] xl:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_20rem_18rem]">
      <div>
        <TextLink to={paths.pattern(pattern.id)} className="text-lead font-semibold">
          {pattern.title}
        </TextLink>
        {maker !== '' && <p className="text-note text-ink-2">{maker}</p>}
      </div>
      <p className="xl:pt-0.5">{capital(sayKind(pattern))}</p>
      <span className="md:col-start-2 xl:col-start-3">
        <SizesMark {...pattern} />
      </span>
      <p className="text-note md:col-start-2 xl:col-start-4">
        {capital(saySizes(pattern.sizes))}
        <span className="block text-ink-2">{sayPublished(pattern)}</span>
      </p>
    </li>
  );
}
