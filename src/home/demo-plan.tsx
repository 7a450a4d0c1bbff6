import { useMemo, useState } from 'react';
import { frontPagePatterns, frontPagePeople } from '../../shared/demo/front-page.ts';
import { buildFitInput } from '../../shared/fit/build-fit-input.ts';
import type { Silhouette } from '../../shared/fit/fit-words.ts';
import { FitView } from '../fit/parts/fit-view.tsx';
import { groundOf, planHeld, type Held } from '../fit/parts/fitting.ts';
import { Fast, LinesWord, Setting, SilhouetteWord, WithComma } from '../fit/parts/setting.tsx';
import { printDay } from '../ui/day.ts';
import { SentenceSelect } from '../ui/sentence-select.tsx';

/** A working plan on invented people and patterns: the same parts and the same engine as everybody's own. */
export function DemoPlan() {
  const [personAt, setPersonAt] = useState(0);
  const [patternAt, setPatternAt] = useState(0);
  const [silhouette, setSilhouette] = useState<Silhouette | null>(null);
  const [cutBetweenLines, setBetween] = useState(false);
  const [held, setHeld] = useState<Held>({});
  const person = frontPagePeople[personAt];
  const chosen = frontPagePatterns[patternAt];
  const ground = useMemo(() => {
    if (!person || !chosen) return null;
    const input = buildFitInput({
      values: person.values,
      takenBy: person.takenBy,
      pattern: chosen.pattern,
      table: chosen.table,
      options: { cutBetweenLines, ...(silhouette !== null && { silhouette }) },
    });
    return groundOf(input, { unit: person.unit, chestWord: person.chestWord });
  }, [person, chosen, silhouette, cutBetweenLines]);
  const plan = useMemo(() => (ground ? planHeld(ground, held) : null), [ground, held]);
  if (!person || !chosen || !ground || !plan) return null;
  const change = (apply: () => void) => {
    apply();
    setHeld({});
  };
  return (
    <>
      <Setting>
        <WithComma>
          <SentenceSelect
            label="Person"
            value={String(personAt)}
            options={frontPagePeople.map(({ name }, index) => ({ value: String(index), label: name }))}
            onChange={(value) => change(() => setPersonAt(Number(value)))}
          />
        </WithComma>{' '}
        measured{' '}
        <WithComma>
          <Fast>{printDay(person.takenOn)}</Fast>
        </WithComma>{' '}
        in the{' '}
        <WithComma>
          <SentenceSelect
            label="Pattern"
            value={String(patternAt)}
            options={frontPagePatterns.map(({ title }, index) => ({ value: String(index), label: title }))}
            onChange={(value) =>
              change(() => {
                setPatternAt(Number(value));
                setSilhouette(null);
              })
            }
          />
        </WithComma>{' '}
        <WithComma>
          <SilhouetteWord
            value={silhouette ?? chosen.pattern.silhouette}
            drafted={chosen.pattern.silhouette}
            onChange={(next) => change(() => setSilhouette(next))}
          />
        </WithComma>{' '}
        of{' '}
        <WithComma>
          <Fast>woven cloth</Fast>
        </WithComma>{' '}
        <LinesWord isBetween={cutBetweenLines} onChange={(next) => change(() => setBetween(next))} />
      </Setting>
      <FitView
        ground={ground}
        plan={plan}
        held={held}
        onHeld={setHeld}
        headingLevel={2}
        cloth={chosen.pattern.cloth}
      />
    </>
  );
}
