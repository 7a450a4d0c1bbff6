/**
 * What a pattern publishes, drawn as everything here is: the body's line where there is a size chart, the cloth's where
 * there are finished measurements, and the room between them where both are known. The words stand beside it.
 */
export function PublishedMark({ hasChart, hasFinished }: { hasChart: boolean; hasFinished: boolean }) {
  return (
    <svg aria-hidden="true" viewBox="0 0 56 24" className="h-6 w-14 shrink-0" fill="none" strokeWidth="2">
      {hasChart && hasFinished && <rect y="5" width="56" height="14" className="fill-woad-tint" />}
      {hasChart && <path d="M0 5h56" className="stroke-ink" />}
      {hasFinished && <path d="M0 19h56" strokeDasharray="6 4" className="stroke-woad" />}
    </svg>
  );
}
