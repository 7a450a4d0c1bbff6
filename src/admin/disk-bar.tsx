/** The disk as everything here is drawn: what is taken as the solid line, the room that is left as the tint. */
export function DiskBar({ freeBytes, totalBytes }: { freeBytes: number; totalBytes: number }) {
  const taken = totalBytes > 0 ? Math.min(1, Math.max(0, 1 - freeBytes / totalBytes)) : 0;
  const width = 320;
  const at = 1 + taken * (width - 2);
  return (
    <svg aria-hidden="true" viewBox={`0 0 ${width} 24`} className="mb-1 block h-6 w-full max-w-80">
      <rect x={at} y="5" width={width - 1 - at} height="14" className="fill-woad-tint" />
      <line x1="0" y1="12" x2={at} y2="12" className="stroke-rule" strokeWidth="1" />
      <line x1={at} y1="1" x2={at} y2="23" className="stroke-ink" strokeWidth="2.5" />
      <line
        x1={width - 1}
        y1="1"
        x2={width - 1}
        y2="23"
        className="stroke-woad"
        strokeWidth="2"
        strokeDasharray="5 3"
      />
    </svg>
  );
}
