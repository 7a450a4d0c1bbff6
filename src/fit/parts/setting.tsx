import type { ReactNode } from 'react';
import { SILHOUETTES, type Silhouette } from '../../../shared/fit/fit-words.ts';
import { SILHOUETTE_WORDS } from '../../../shared/fit/say-words.ts';
import { SentenceSelect } from '../../ui/sentence-select.tsx';

/** Who, measured when, in what, of what: one sentence whose dashed-underlined words can be changed in place. */
export function Setting({ children }: { children: ReactNode }) {
  return <p className="max-w-[60em] text-lead text-ink-2">{children}</p>;
}

/** A word and the comma after it, which never begins a line. */
export function WithComma({ children }: { children: ReactNode }) {
  return (
    <span className="whitespace-nowrap *:max-w-[calc(100%-0.6ch)] *:whitespace-normal">{children},</span>
  );
}

/** A word of the setting that stands fast. */
export function Fast({ children }: { children: ReactNode }) {
  return <span className="font-semibold text-ink">{children}</span>;
}

interface LinesWordProps {
  isBetween: boolean;
  onChange: (isBetween: boolean) => void;
}

/** Whether it is cut along the sizes' own lines, or half-way between two as well. */
export function LinesWord({ isBetween, onChange }: LinesWordProps) {
  return (
    <>
      cut{' '}
      <SentenceSelect
        label="Cutting lines"
        value={isBetween ? 'between' : 'along'}
        options={[
          { value: 'along', label: 'along the lines' },
          { value: 'between', label: 'also between them', inList: 'also between them, by half sizes' },
        ]}
        onChange={(value) => onChange(value === 'between')}
      />
    </>
  );
}

interface SilhouetteWordProps {
  value: Silhouette;
  /** The pattern's own, said in the list. */
  drafted: Silhouette;
  onChange: (silhouette: Silhouette) => void;
}

/** How the garment is meant to sit. It decides which points choose the size. */
export function SilhouetteWord({ value, drafted, onChange }: SilhouetteWordProps) {
  return (
    <SentenceSelect<Silhouette>
      label="Silhouette"
      value={value}
      options={SILHOUETTES.map((silhouette) => ({
        value: silhouette,
        label: SILHOUETTE_WORDS[silhouette],
        inList:
          silhouette === drafted
            ? `${SILHOUETTE_WORDS[silhouette]}, as the pattern says`
            : SILHOUETTE_WORDS[silhouette],
      }))}
      onChange={onChange}
    />
  );
}
