interface SizesMarkProps {
  sizes: readonly string[];
  hasChart: boolean;
  hasFinished: boolean;
}

const STEP = 11;
/** More sizes than this stand closer together: the drawing keeps its place in the row. */
const WIDTH_MAX = 190;

/**
 * A pattern in little: a stroke for every size from the first to the last, the body's line over them where there is a
 * size chart, the cloth's under them where there are finished measurements, and the room filled where both are known.
 * The words beside it say the same.
 */
export function SizesMark({ sizes, hasChart, hasFinished }: SizesMarkProps) {
  const steps = Math.max(1, sizes.length - 1);
  const width = Math.min(WIDTH_MAX, steps * STEP);
  const step = sizes.length === 1 ? 0 : width / steps;
  return (
    <span aria-hidden="true" className="flex items-center gap-2.5">
      <span className="max-w-16 truncate text-small font-semibold">{sizes[0]}</span>
      <svg width={width + 8} height="30" fill="none" strokeWidth="2" className="shrink-0">
        {hasChart && hasFinished && <rect y="5" width={width + 8} height="20" className="fill-woad-tint" />}
        {sizes.map((size, at) => (
          <path key={size} d={`M${4 + at * step} 9v12`} strokeWidth="1.25" className="stroke-ink-2" />
        ))}
        {hasChart && <path d={`M0 5h${width + 8}`} className="stroke-ink" />}
        {hasFinished && <path d={`M0 25h${width + 8}`} strokeDasharray="6 4" className="stroke-woad" />}
      </svg>
      {sizes.length > 1 && (
        <span className="max-w-16 truncate text-small font-semibold">{sizes[sizes.length - 1]}</span>
      )}
    </span>
  );
}
