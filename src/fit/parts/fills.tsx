import type { Verdict } from '../../../shared/fit/fit-words.ts';

/** The fills that say a verdict without colour, drawn once a page and used by name in every bar. */
export function Fills({ id }: { id: string }) {
  return (
    <svg aria-hidden="true" width="0" height="0" className="absolute">
      <defs>
        <pattern
          id={`${id}-closer`}
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width="6" height="6" fill="var(--woad-tint)" />
          <line x1="0" y1="0" x2="0" y2="6" stroke="var(--woad)" strokeWidth="2.2" />
        </pattern>
        <pattern id={`${id}-looser`} width="8" height="8" patternUnits="userSpaceOnUse">
          <rect width="8" height="8" fill="var(--woad-tint)" />
          <circle cx="2" cy="2" r="1.25" fill="var(--woad)" />
          <circle cx="6" cy="6" r="1.25" fill="var(--woad)" />
        </pattern>
        <pattern
          id={`${id}-belowFloor`}
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width="6" height="6" fill="var(--madder-tint)" />
          <path d="M0 0H6M0 0V6" stroke="var(--madder)" strokeWidth="2" />
        </pattern>
      </defs>
    </svg>
  );
}

/** The fill of a verdict: plain where it is as drafted, none where nothing can be said. */
export function fillOf(verdict: Verdict, id: string): string {
  if (verdict === 'unknown') return 'none';
  return verdict === 'asDrafted' ? 'var(--woad-tint)' : `url(#${id}-${verdict})`;
}
