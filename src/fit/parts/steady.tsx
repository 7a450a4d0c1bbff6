import { useLayoutEffect, useRef, type ReactNode } from 'react';

interface SteadyProps {
  /** While this stays, the height only grows. */
  until: unknown;
  children: ReactNode;
}

/** Keeps what stands below where it is: words that change in length while something is dragged would make it jump. */
export function Steady({ until, children }: SteadyProps) {
  const outer = useRef<HTMLDivElement>(null);
  const inner = useRef<HTMLDivElement>(null);
  const kept = useRef({ until, width: 0, height: 0 });
  useLayoutEffect(() => {
    if (!outer.current || !inner.current) return;
    const { width, height } = inner.current.getBoundingClientRect();
    const { current } = kept;
    const isSame = until !== null && current.width === width && (current.until ?? until) === until;
    kept.current = { until, width, height: isSame ? Math.max(current.height, height) : height };
    outer.current.style.minHeight = `${Math.ceil(kept.current.height)}px`;
  });
  return (
    <div ref={outer} className="print:min-h-0!">
      <div ref={inner}>{children}</div>
    </div>
  );
}
