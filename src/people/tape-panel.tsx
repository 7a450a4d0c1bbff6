import type { Person } from '../../shared/people/people.schema.ts';
import { howToTake, pointName } from '../../shared/points/catalogue.ts';
import type { PointId } from '../../shared/points/point-ids.ts';
import { BodyFigure } from './drawing/body-figure.tsx';

/** On a wide screen: where the tape goes for the field one is in. Each field has the same words to unfold. */
export function TapePanel({ point, chestWord }: { point: PointId; chestWord: Person['chestWord'] }) {
  return (
    <div aria-hidden="true" className="sticky top-8 hidden max-w-[30rem] lg:block print:hidden">
      <p className="text-section font-semibold">{pointName(point, chestWord)}</p>
      <p className="mt-1 min-h-[6em] text-note text-ink-2">{howToTake(point, chestWord)}</p>
      <div className="mt-5 flex gap-12">
        {(['front', 'back'] as const).map((view) => (
          <figure key={view}>
            <BodyFigure view={view} active={point} className="h-[24rem]" />
            <figcaption className="mt-2 text-center text-small text-ink-2">
              {view === 'front' ? 'Front' : 'Back'}
            </figcaption>
          </figure>
        ))}
      </div>
    </div>
  );
}
