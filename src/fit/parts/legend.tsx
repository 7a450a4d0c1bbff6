import { useId, type ReactNode } from 'react';
import type { Verdict } from '../../../shared/fit/fit-words.ts';
import { VERDICT_WORDS } from '../../../shared/fit/say-words.ts';
import { Triangle } from './ease-bar.tsx';
import { fillOf, Fills } from './fills.tsx';

const FILLED: readonly Verdict[] = ['asDrafted', 'closer', 'looser', 'belowFloor'];

/** What the marks mean, once. */
export function Legend({ canChange }: { canChange: boolean }) {
  const id = useId();
  return (
    <div className="border-t border-rule pt-4 text-small text-ink-2">
      <Fills id={id} />
      <ul aria-label="What the marks mean" className="flex flex-wrap gap-x-7 gap-y-2">
        <Item word="the body">
          <line x1="14" x2="14" y1="1" y2="21" stroke="var(--ink)" strokeWidth="3" />
        </Item>
        <Item word="the cloth, at the size you cut">
          <line x1="14" x2="14" y1="1" y2="21" stroke="var(--woad)" strokeWidth="3" strokeDasharray="5 3" />
        </Item>
        <Item word="wearing ease, the least to move in">
          <line x1="14" x2="14" y1="1" y2="21" stroke="var(--ink-2)" strokeWidth="1.5" />
        </Item>
        <Item word="drafted ease, as the maker meant it">
          <Triangle x={14} y={16} />
        </Item>
        <Item word="the cloth in other sizes">
          <path d="M8 8V14M20 8V14" stroke="var(--ink-2)" strokeOpacity="0.75" />
        </Item>
        {FILLED.map((verdict) => (
          <Item
            key={verdict}
            word={verdict === 'belowFloor' ? VERDICT_WORDS[verdict] : `room: ${VERDICT_WORDS[verdict]}`}
          >
            <rect x="1" y="4" width="27" height="14" fill={fillOf(verdict, id)} />
          </Item>
        ))}
        <Item word="a branch: neck or sleeve">
          <line x1="1" x2="28" y1="11" y2="11" stroke="var(--woad)" strokeWidth="2" strokeDasharray="2 4" />
        </Item>
      </ul>
      {canChange && (
        <p className="mt-3 max-w-[70ch] print:hidden">
          Drag a size along the path, click another, or use the arrow keys; Delete lets go of it. What you
          hold stays, and the rest is planned round it.
        </p>
      )}
    </div>
  );
}

function Item({ word, children }: { word: string; children: ReactNode }) {
  return (
    <li className="flex items-center gap-2">
      <svg aria-hidden="true" width="29" height="22" className="shrink-0">
        {children}
      </svg>
      {word}
    </li>
  );
}
