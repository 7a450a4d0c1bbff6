import type { FitOption, FitPlan } from '../../../shared/fit/fit.schema.ts';
import type { ZoneId } from '../../../shared/fit/fit-words.ts';
import { sayBeforeCutting, sayBlend, sayOption } from '../../../shared/fit/say-cutting.ts';
import type { SayContext } from '../../../shared/fit/say-words.ts';
import { SectionHeading } from '../../ui/page-heading.tsx';

interface OptionsProps {
  options: readonly FitOption[];
  plan: FitPlan;
  context: SayContext;
  /** Left out where nothing can be changed. */
  onTake?: (sizes: Partial<Record<ZoneId, number>>) => void;
}

/** The ways to cut it that were weighed against one another, each with what it gives up. */
export function Options({ options, plan, context, onTake }: OptionsProps) {
  if (options.length === 0) return null;
  return (
    <section>
      <SectionHeading>Ways to cut it</SectionHeading>
      <ul className="mt-3 divide-y divide-rule border-y border-rule">
        {options.map((option) => {
          const said = sayOption(option, context);
          const isShown = sameSizes(option, plan);
          return (
            <li key={`${option.kind} ${said.title}`} className="py-3">
              <p className="font-semibold">{said.title}</p>
              <p className="text-note text-ink-2">{said.costs}</p>
              {isShown ? (
                <p className="mt-1 text-note font-semibold">This is what is drawn.</p>
              ) : (
                onTake && (
                  <button
                    type="button"
                    aria-label={`Cut it this way: ${said.title}`}
                    className="inline-flex min-h-11 items-center font-semibold text-woad print:hidden"
                    onClick={() => onTake(sizesOf(option))}
                  >
                    <span className="changeable leading-tight">Cut it this way</span>
                  </button>
                )
              )}
            </li>
          );
        })}
      </ul>
    </section>
  );
}

function sizesOf(option: FitOption): Partial<Record<ZoneId, number>> {
  return Object.fromEntries(option.zones.map(({ zone, size }) => [zone, size.position]));
}

function sameSizes(option: FitOption, plan: FitPlan): boolean {
  const sizes = sizesOf(option);
  return plan.zones.every(({ zone, size }) => sizes[zone] === size.position);
}

/** Where to leave one size's line and meet another's. */
export function Cutting({ plan, context }: { plan: FitPlan; context: SayContext }) {
  return (
    <section>
      <SectionHeading>Where to change line</SectionHeading>
      {plan.blends.length === 0 ? (
        <p className="mt-3 text-note text-ink-2">Nowhere: one line runs from top to bottom.</p>
      ) : (
        <ol className="mt-3 divide-y divide-rule border-y border-rule">
          {plan.blends.map((blend) => {
            const { title, words } = sayBlend(blend, context);
            return (
              <li key={title} className="py-3">
                <p className="font-semibold">{title}</p>
                <p className="text-note">{words}</p>
              </li>
            );
          })}
        </ol>
      )}
    </section>
  );
}

/** What to do before the shears: common practice, with what this plan asks for first. */
export function BeforeCutting({
  plan,
  context,
  cloth,
}: {
  plan: FitPlan;
  context: SayContext;
  cloth: string;
}) {
  return (
    <section>
      <SectionHeading>Before you cut</SectionHeading>
      <ol className="mt-3 list-decimal space-y-2 pl-5 text-note marker:text-ink-2">
        {sayBeforeCutting(plan, context, cloth).map((words) => (
          <li key={words}>{words}</li>
        ))}
      </ol>
    </section>
  );
}
