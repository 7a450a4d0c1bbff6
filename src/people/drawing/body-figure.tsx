import { BODY_MARKS, type BodyMark } from './body-marks.ts';
import type { PointId } from '../../../shared/points/point-ids.ts';
import { BACK_LINES, FRONT_LINES, HALF_OUTLINE, SHEET } from './body-outline.ts';
import { smoothPath } from './smooth-path.ts';

interface BodyFigureProps {
  view: 'front' | 'back';
  /** The points drawn faintly: those that are known. */
  known?: readonly PointId[];
  /** The point the tape is drawn for. */
  active?: PointId | null;
  className?: string;
}

/** The figure from the front or the back, solid; the tape on it, dashed. A picture beside words that say the same. */
export function BodyFigure({ view, known = [], active = null, className }: BodyFigureProps) {
  const marks = known.flatMap((point) => {
    const mark = BODY_MARKS[point];
    return mark?.view === view && point !== active ? [{ point, mark }] : [];
  });
  const tape = active === null ? undefined : BODY_MARKS[active];
  return (
    <svg
      aria-hidden="true"
      viewBox={`0 0 ${SHEET.width} ${SHEET.height}`}
      className={`overflow-visible ${className ?? ''}`}
      fill="none"
      strokeLinecap="round"
      strokeLinejoin="round"
    >
      <Half view={view} />
      <g transform={`translate(${SHEET.width} 0) scale(-1 1)`}>
        <Half view={view} />
      </g>
      {view === 'back' && <circle cx="80" cy="61" r="1.6" className="fill-ink-2" />}
      <g className="stroke-woad" strokeWidth="1" strokeDasharray="3 2.4" opacity="0.75">
        {marks.map(({ point, mark }) => (
          <Tape key={point} mark={mark} />
        ))}
      </g>
      {tape?.view === view && (
        <g className="stroke-woad" strokeWidth="2.4" strokeDasharray="5 3.4" strokeLinecap="butt">
          <Tape mark={tape} hasEnds />
        </g>
      )}
    </svg>
  );
}

function Half({ view }: { view: 'front' | 'back' }) {
  return (
    <>
      {HALF_OUTLINE.map((path) => (
        <path key={path} d={path} className="stroke-ink" strokeWidth="1.6" />
      ))}
      {(view === 'front' ? FRONT_LINES : BACK_LINES).map((path) => (
        <path key={path} d={path} className="stroke-ink-2" strokeWidth="1" />
      ))}
    </>
  );
}

function Tape({ mark, hasEnds = false }: { mark: BodyMark; hasEnds?: boolean }) {
  if (mark.kind === 'loop') {
    const [x, y] = mark.at;
    const half = (sweep: 0 | 1) =>
      `M${x - mark.rx} ${y}A${mark.rx} ${mark.ry} 0 0 ${sweep} ${x + mark.rx} ${y}`;
    // The half in front lies lower; the one behind the body is fainter.
    return (
      <g transform={`rotate(${mark.tilt ?? 0} ${x} ${y})`}>
        <path d={half(0)} />
        <path d={half(1)} strokeWidth="1" opacity="0.6" />
      </g>
    );
  }
  const path =
    mark.smooth === true
      ? smoothPath(mark.through)
      : mark.through.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${x} ${y}`).join('');
  const ends = [mark.through[0], mark.through.at(-1)];
  return (
    <>
      <path d={path} />
      {hasEnds &&
        ends.map(
          (end) =>
            end && (
              <circle
                key={end.join()}
                cx={end[0]}
                cy={end[1]}
                r="2.6"
                className="fill-paper"
                strokeDasharray="none"
              />
            ),
        )}
    </>
  );
}
