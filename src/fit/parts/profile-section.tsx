import { lazy, Suspense, useEffect, useRef, useState } from 'react';
import type { FitPlan, PointResult } from '../../../shared/fit/fit.schema.ts';
import { sayProfile } from '../../../shared/fit/say-profile.ts';
import { sayPoint } from '../../../shared/fit/say-words.ts';
import { SentenceSelect } from '../../ui/sentence-select.tsx';
import type { Ground } from './fitting.ts';
import { rowsInOrder } from './row-order.ts';

const EaseProfile = lazy(async () => ({ default: (await import('./ease-profile.tsx')).EaseProfile }));

const UNIT_WORDS = { cm: 'centimetres', mm: 'millimetres', in: 'inches' } as const;

/** One point's ease over all sizes. The chart library is fetched only when somebody comes near it. */
export function ProfileSection({ ground, plan }: { ground: Ground; plan: FitPlan }) {
  const box = useRef<HTMLElement>(null);
  const isNear = useIsNear(box);
  const [asked, setAsked] = useState<string | null>(null);
  const results = rowsInOrder(plan).flatMap(({ result }) =>
    result?.easeMm === null || result === null ? [] : [result],
  );
  const result = results.find(({ point }) => point === asked) ?? nearestToFloor(results);
  if (!result || ground.context.sizes.length < 2) return null;
  const ladder = ground.ladders.get(result.point) ?? [];
  const { context } = ground;
  return (
    <section ref={box} className="mt-14 print:hidden">
      <h2 className="text-section font-semibold tracking-[-0.005em]">
        Ease in every size at the{' '}
        <SentenceSelect
          label="Point"
          value={result.point}
          options={results.map(({ point }) => ({ value: point, label: sayPoint(point, context.chestWord) }))}
          onChange={setAsked}
        />
      </h2>
      <figure className="mt-2 max-w-[56rem]">
        <figcaption className="text-note text-ink-2">
          {sayProfile(result.point, ladder, result.floorMm, context)} Drawn from the body, in{' '}
          {UNIT_WORDS[context.unit]}.
        </figcaption>
        <div aria-hidden="true" className="mt-4 h-75">
          {isNear && (
            <Suspense fallback={<p className="come-in-late text-note text-ink-2">Drawing the sizes</p>}>
              <EaseProfile result={result} ladder={ladder} context={context} />
            </Suspense>
          )}
        </div>
      </figure>
    </section>
  );
}

/** Where there is least leeway one looks first. */
function nearestToFloor(results: readonly PointResult[]): PointResult | undefined {
  return [...results].sort((a, b) => (a.leewayMm ?? Infinity) - (b.leewayMm ?? Infinity))[0];
}

function useIsNear(element: React.RefObject<HTMLElement | null>): boolean {
  const [isNear, setNear] = useState(false);
  useEffect(() => {
    const node = element.current;
    if (!node || isNear) return;
    const observer = new IntersectionObserver(
      (entries) => {
        if (entries.some((entry) => entry.isIntersecting)) setNear(true);
      },
      { rootMargin: '400px' },
    );
    observer.observe(node);
    return () => observer.disconnect();
  }, [element, isNear]);
  return isNear;
}
