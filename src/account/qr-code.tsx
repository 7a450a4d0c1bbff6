import { encode } from 'uqr';

/** The squares that are dark, as one SVG path; a square is one unit. */
function darkSquares(text: string): { size: number; path: string } {
  // The quiet zone is drawn by the picture, four squares wide, as the standard asks (ISO/IEC 18004).
  const { data, size } = encode(text, { ecc: 'M', border: 0 });
  let path = '';
  data.forEach((row, y) =>
    row.forEach((isDark, x) => {
      if (isDark) path += `M${x} ${y}h1v1h-1z`;
    }),
  );
  return { size, path };
}

const QUIET = 4;

/** A text as a square code for a phone's camera: dark on light in both schemes, since readers count on it. */
export function QrCode({ text, label }: { text: string; label: string }) {
  const { size, path } = darkSquares(text);
  return (
    <svg
      role="img"
      aria-label={label}
      viewBox={`${-QUIET} ${-QUIET} ${size + 2 * QUIET} ${size + 2 * QUIET}`}
      shapeRendering="crispEdges"
      className="size-56 shrink-0 border border-rule forced-color-adjust-none"
    >
      <rect x={-QUIET} y={-QUIET} width={size + 2 * QUIET} height={size + 2 * QUIET} fill="#ffffff" />
      <path d={path} fill="#000000" />
    </svg>
  );
}
