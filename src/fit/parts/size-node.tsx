import type { KeyboardEvent } from 'react';
import type { PathGeometry } from './size-window.ts';
import { useSizeDrag } from './use-size-drag.ts';

interface SizeNodeProps {
  /** “Size at the hip”. */
  label: string;
  /** “16, hip: ease 6.0 cm, as drafted”. */
  valueText: string;
  sizeLabel: string;
  position: number;
  sizeCount: number;
  geometry: PathGeometry;
  /** The path column's left edge and the row's middle, in the row's own px. */
  left: number;
  middle: number;
  isHeld: boolean;
  /** A zone's other rows carry a plain dot: the same zone, taken hold of by pointer only. */
  isHandle: boolean;
  isReadOnly: boolean;
  onMove: (position: number) => void;
  onRelease: () => void;
  onDragging: (isDragging: boolean) => void;
}

/** A zone's size on the path: dragged, or moved with the keys. It is 44 px square however small it is drawn. */
export function SizeNode(props: SizeNodeProps) {
  const { geometry, position, sizeCount, onMove, onDragging, isHandle, isReadOnly } = props;
  const drag = useSizeDrag({ geometry, position, sizeCount, onMove, onDragging });
  const { x } = geometry.toXWithin(position);
  const place = { left: props.left + x - 22, top: props.middle - 22 };
  if (isReadOnly) {
    return (
      <span aria-hidden="true" className="absolute grid size-11 place-items-center" style={place}>
        <Mark {...props} />
      </span>
    );
  }
  const hand = 'absolute z-1 grid size-11 cursor-ew-resize touch-pan-y place-items-center select-none';
  if (!isHandle) {
    return (
      <span aria-hidden="true" className={hand} style={place} {...drag}>
        <Mark {...props} />
      </span>
    );
  }
  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label={props.label}
      aria-orientation="horizontal"
      aria-valuemin={0}
      aria-valuemax={sizeCount - 1}
      aria-valuenow={position}
      aria-valuetext={props.valueText}
      onKeyDown={(event) => moveByKey(event, props)}
      className={`${hand} group outline-none`}
      style={place}
      {...drag}
    >
      <Mark {...props} />
    </div>
  );
}

function Mark({ isHandle, isHeld, sizeLabel }: SizeNodeProps) {
  if (!isHandle) return <span className="size-2.5 rounded-full border-2 border-woad bg-paper" />;
  const text = sizeLabel.length > 5 ? 'text-[0.6875rem]' : 'text-small';
  return (
    <span
      className={`max-w-19 min-w-7.5 truncate rounded-full border-2 border-woad px-1.5 text-center leading-6 font-semibold [print-color-adjust:exact] group-focus-visible:outline-3 group-focus-visible:outline-offset-2 group-focus-visible:outline-woad ${text} ${
        isHeld ? 'bg-woad text-paper' : 'bg-paper text-ink'
      }`}
    >
      {sizeLabel}
    </span>
  );
}

function moveByKey(event: KeyboardEvent, props: SizeNodeProps) {
  const { geometry, position, sizeCount, onMove, onRelease } = props;
  if (event.key === 'Delete' || event.key === 'Backspace') {
    event.preventDefault();
    onRelease();
    return;
  }
  const next = keyTarget(event.key, position, sizeCount - 1, geometry.stop);
  if (next === null) return;
  event.preventDefault();
  const target = Math.max(0, Math.min(sizeCount - 1, next));
  if (target !== position) onMove(target);
}

function keyTarget(key: string, position: number, last: number, stop: number): number | null {
  switch (key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return position + stop;
    case 'ArrowLeft':
    case 'ArrowDown':
      return position - stop;
    case 'PageUp':
      return position + 3;
    case 'PageDown':
      return position - 3;
    case 'Home':
      return 0;
    case 'End':
      return last;
    default:
      return null;
  }
}
