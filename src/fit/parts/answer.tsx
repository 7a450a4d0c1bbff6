import type { FitPlan } from '../../../shared/fit/fit.schema.ts';
import type { Said } from '../../../shared/fit/say-cautions.ts';
import { sayNotes } from '../../../shared/fit/say-notes.ts';
import type { SayContext } from '../../../shared/fit/say-words.ts';

/** How many sentences stand in the open; the rest is a click away. */
const IN_THE_OPEN = 3;

interface WatchProps {
  plan: FitPlan;
  context: SayContext;
  /** Whether what is held is said here; where it can be let go of, it is said there. */
  saysHeld: boolean;
}

/** What stands under the answer: what to watch and to measure again first, then why the plan is what it is. */
export function Watch({ plan, context, saysHeld }: WatchProps) {
  const said = sayNotes(plan, context).filter((each) => saysHeld || each.code !== 'held');
  const first = said.slice(0, IN_THE_OPEN);
  const rest = said.slice(IN_THE_OPEN);
  if (said.length === 0) return null;
  return (
    <div className="mt-5 text-note">
      <ul className="grid gap-x-10 gap-y-2.5 md:grid-cols-3">
        {first.map((each) => (
          <Sentence key={each.code} said={each} />
        ))}
      </ul>
      {rest.length > 0 && (
        <details className="group mt-2 print:[&::details-content]:[content-visibility:visible]">
          <summary className="inline-flex min-h-11 list-none items-center font-semibold text-woad print:hidden [&::-webkit-details-marker]:hidden">
            <span className="changeable leading-tight group-open:hidden">
              {rest.length === 1 ? 'One more note' : `${rest.length} more notes`}
            </span>
            <span className="changeable hidden leading-tight group-open:inline">Fewer notes</span>
          </summary>
          <ul className="mt-1 grid gap-x-10 gap-y-2.5 md:grid-cols-3">
            {rest.map((each) => (
              <Sentence key={each.code} said={each} />
            ))}
          </ul>
        </details>
      )}
    </div>
  );
}

function Sentence({ said }: { said: Said }) {
  const look =
    said.code === 'belowFloor'
      ? 'font-semibold text-madder'
      : said.tone === 'note'
        ? 'text-ink-2'
        : 'font-medium text-ink';
  return <li className={`max-w-[46ch] ${look}`}>{said.words}</li>;
}
