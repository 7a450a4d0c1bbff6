import { useEffect, useRef, type PointerEvent } from 'react';
import type { PathGeometry } from './size-window.ts';

/** How often a node held at the edge goes on by one stop, in ms. */
const EDGE_STEP_MS = 220;
/** How far, in px, a pointer moves before it counts as dragging rather than as a click. */
const SLACK_PX = 4;

interface SizeDrag {
  geometry: PathGeometry;
  position: number;
  sizeCount: number;
  onMove: (position: number) => void;
  /** While somebody drags, the window of sizes stands still under the pointer as long as it can. */
  onDragging: (isDragging: boolean) => void;
}

/** Where a pointer has taken hold of a node. */
interface Grip {
  pointer: number;
  offset: number;
  startX: number;
  isMoving: boolean;
}

/** Dragging a node across the sizes. At the edge of what is drawn it goes on, a size at a time. */
export function useSizeDrag(drag: SizeDrag) {
  const latest = useRef(drag);
  useEffect(() => {
    latest.current = drag;
  });
  const grip = useRef<Grip | null>(null);
  const edge = useEdgeSteps(latest);

  const end = (event: PointerEvent) => {
    if (grip.current?.pointer !== event.pointerId) return;
    grip.current = null;
    edge.stop();
    latest.current.onDragging(false);
  };
  return {
    onPointerDown: (event: PointerEvent) => {
      if (event.button !== 0) return;
      const { geometry, position } = latest.current;
      event.currentTarget.setPointerCapture(event.pointerId);
      const offset = event.clientX - geometry.toXWithin(position).x;
      grip.current = { pointer: event.pointerId, offset, startX: event.clientX, isMoving: false };
    },
    onPointerMove: (event: PointerEvent) => {
      const held = grip.current;
      if (held?.pointer !== event.pointerId) return;
      if (!held.isMoving && Math.abs(event.clientX - held.startX) < SLACK_PX) return;
      if (!held.isMoving) latest.current.onDragging(true);
      held.isMoving = true;
      const { geometry, position, onMove } = latest.current;
      const x = event.clientX - held.offset;
      const beyond = x < 0 ? -1 : x > geometry.width ? 1 : 0;
      if (beyond !== 0) {
        edge.start(beyond);
        return;
      }
      edge.stop();
      const next = geometry.toPosition(x);
      if (next !== position) onMove(next);
    },
    onPointerUp: end,
    onPointerCancel: end,
  };
}

/** Steps on while the pointer stays beyond the edge; the window of sizes follows the node. */
function useEdgeSteps(latest: { current: SizeDrag }) {
  const timer = useRef<ReturnType<typeof setInterval>>(undefined);
  const stop = () => {
    clearInterval(timer.current);
    timer.current = undefined;
  };
  useEffect(() => stop, []);
  const start = (direction: -1 | 1) => {
    timer.current ??= setInterval(() => {
      const { geometry, position, sizeCount, onMove } = latest.current;
      const next = position + direction * geometry.stop;
      if (next >= 0 && next <= sizeCount - 1) onMove(next);
    }, EDGE_STEP_MS);
  };
  return { start, stop };
}
