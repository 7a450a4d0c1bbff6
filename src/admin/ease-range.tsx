const WIDTH = 240;
/** What the axis holds, in mm. */
const WIDEST_MM = 120;

/** A range of ease as the fit view draws it: the body's solid line at nought, the room as the tint, the cloth dashed. */
export function EaseRange({ lowMm, highMm }: { lowMm: number; highMm: number | null }) {
  const at = (mm: number) => 2 + (Math.min(mm, WIDEST_MM) / WIDEST_MM) * (WIDTH - 4);
  const [from, to] = [at(lowMm), at(highMm ?? WIDEST_MM)];
  return (
    <svg aria-hidden="true" viewBox={`0 0 ${WIDTH} 18`} className="mt-1.5 block h-4.5 w-60 max-md:hidden">
      <line x1="0" y1="9" x2={WIDTH} y2="9" className="stroke-rule" strokeWidth="1" />
      <rect x={from} y="4" width={Math.max(0, to - from)} height="10" className="fill-woad-tint" />
      <line x1="1.25" y1="0" x2="1.25" y2="18" className="stroke-ink" strokeWidth="2.5" />
      <line x1={from} y1="1" x2={from} y2="17" className="stroke-ink-2" strokeWidth="1" />
      {highMm !== null && (
        <line
          x1={to}
          y1="1"
          x2={to}
          y2="17"
          className="stroke-woad"
          strokeWidth="2"
          strokeDasharray="4 2.5"
        />
      )}
    </svg>
  );
}
