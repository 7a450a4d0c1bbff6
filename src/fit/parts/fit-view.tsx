import type { ReactNode } from 'react';
import type { FitPlan } from '../../../shared/fit/fit.schema.ts';
import { sayPlan } from '../../../shared/fit/say-plan.ts';
import { listWords, sayInSize, sayZone } from '../../../shared/fit/say-words.ts';
import { Watch } from './answer.tsx';
import { BeforeCutting, Cutting, Options } from './beside.tsx';
import { FitTable } from './fit-table.tsx';
import type { Ground, Held } from './fitting.ts';
import { Instrument } from './instrument.tsx';
import { Legend } from './legend.tsx';
import { Steady } from './steady.tsx';

interface FitViewProps {
  ground: Ground;
  plan: FitPlan;
  held: Held;
  /** Left out where a plan is only looked at. */
  onHeld?: (held: Held) => void;
  /** The answer is the page's heading, or stands under one. */
  headingLevel: 1 | 2;
  /** The cloth the pattern is meant for, in its maker's words, where they are known. */
  cloth?: string;
  /** The answer names the document too. */
  isPage?: boolean;
  /** Between what is said and what is drawn: saving, for example. */
  actions?: ReactNode;
}

/** The whole answer: the sentence, what to watch, the instrument, and what to do at the table. */
export function FitView({
  ground,
  plan,
  held,
  onHeld,
  headingLevel,
  isPage = false,
  cloth = '',
  actions,
}: FitViewProps) {
  const { context } = ground;
  const answer = sayPlan(plan, context);
  const Heading = headingLevel === 1 ? 'h1' : 'h2';
  const isHeld = Object.keys(held).length > 0;
  // With one size there is nothing to choose among.
  const hold = context.sizes.length > 1 ? onHeld : undefined;
  return (
    <>
      {isPage && <title>{`${answer.replace(/[.]$/, '')} · Leeway`}</title>}
      <Steady until={isHeld ? ground : null}>
        <Heading
          tabIndex={-1}
          aria-live="polite"
          className="mt-3 max-w-[25em] text-answer font-bold tracking-[-0.02em] break-words outline-none"
        >
          {answer}
        </Heading>
        <Watch plan={plan} context={context} saysHeld={!onHeld} />
      </Steady>
      <div className="mt-3 mb-2 flex flex-wrap items-start justify-between gap-x-10 gap-y-2">
        {onHeld && plan.zones.length > 0 && (
          <HoldLine ground={ground} plan={plan} held={held} onBack={() => onHeld({})} />
        )}
        {actions}
      </div>
      {plan.zones.length > 0 && (
        <>
          <section aria-label="The instrument" className="mt-1">
            <Instrument
              ground={ground}
              plan={plan}
              held={held}
              {...(hold && {
                onHold: (zone, position) => hold({ ...held, [zone]: position }),
                onRelease: (zone) =>
                  hold(Object.fromEntries(Object.entries(held).filter(([each]) => each !== zone))),
              })}
            />
          </section>
          <Legend canChange={hold !== undefined} />
          <details className="mt-4 print:hidden">
            <summary className="inline-flex min-h-11 list-none items-center font-semibold text-woad [&::-webkit-details-marker]:hidden">
              <span className="changeable leading-tight">The same as a table</span>
            </summary>
            <FitTable plan={plan} held={held} context={context} />
          </details>
          <div className="mt-10 grid gap-x-14 gap-y-10 lg:grid-cols-3">
            <Cutting plan={plan} context={context} />
            <Options
              options={ground.plan.options}
              plan={plan}
              context={context}
              {...(hold && { onTake: hold })}
            />
            <BeforeCutting plan={plan} context={context} cloth={cloth} />
          </div>
        </>
      )}
    </>
  );
}

interface HoldLineProps {
  ground: Ground;
  plan: FitPlan;
  held: Held;
  onBack: () => void;
}

/** What is held, and the one click that lets go of it all; beforehand, that sizes can be taken hold of. */
function HoldLine({ ground, plan, held, onBack }: HoldLineProps) {
  const words = plan.zones
    .filter(({ zone }) => held[zone] !== undefined)
    .map(({ zone, size }) => `${sayZone(zone, ground.context.chestWord)} ${sayInSize(size, 'at')}`);
  return (
    <p className="flex min-h-11 flex-wrap items-center gap-x-5 print:hidden">
      {words.length === 0 ? (
        <span className="text-ink-2">Another size here or there? Drag it along the path below.</span>
      ) : (
        <>
          <span>You hold the {listWords(words)}.</span>
          <button
            type="button"
            className="inline-flex min-h-11 items-center font-semibold text-woad"
            onClick={onBack}
          >
            <span className="changeable leading-tight">Back to the plan</span>
          </button>
        </>
      )}
    </p>
  );
}
