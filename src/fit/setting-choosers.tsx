import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import type { MeasurementSet, Person } from '../../shared/people/people.schema.ts';
import { measurementSetsQuery, peopleQuery } from '../people/queries.ts';
import { patternsQuery } from '../patterns/queries.ts';
import { printDay } from '../ui/day.ts';
import { SentenceSelect, type SentenceOption } from '../ui/sentence-select.tsx';

/** Changes part of the address; what was held belonged to the setting before. */
export function useSettingChange() {
  const [, setSearch] = useSearchParams();
  return (change: Record<string, string | null>) =>
    setSearch(
      (current) => {
        const next = new URLSearchParams(current);
        next.delete('hold');
        for (const [name, value] of Object.entries(change)) {
          if (value === null) next.delete(name);
          else next.set(name, value);
        }
        return next;
      },
      { preventScrollReset: true },
    );
}

/** Who it is for: choosing somebody takes their latest measurements. */
export function PersonWord({ person }: { person: Person | null }) {
  const change = useSettingChange();
  const { data: people } = useQuery(peopleQuery());
  const options: SentenceOption[] = (people?.items ?? []).map((each) => ({
    value: each.id,
    label: each.name,
    ...(each.latestSetId === null && { inList: `${each.name}, not measured yet`, isDisabled: true }),
  }));
  if (person && !options.some((option) => option.value === person.id)) {
    options.unshift({ value: person.id, label: person.name });
  }
  return (
    <SentenceSelect
      label="Person"
      placeholder="somebody"
      value={person?.id ?? ''}
      options={options}
      onChange={(personId) => {
        const next = people?.items.find((each) => each.id === personId);
        if (next?.latestSetId != null) change({ set: next.latestSetId });
      }}
    />
  );
}

/** Which of their measurings it goes by. */
export function MeasuredWord({ set }: { set: MeasurementSet }) {
  const change = useSettingChange();
  const { data: sets } = useQuery(measurementSetsQuery(set.personId));
  const known = sets?.items ?? [];
  const all = known.some((each) => each.id === set.id) ? known : [set, ...known];
  return (
    <SentenceSelect
      label="Measured"
      value={set.id}
      options={all.map((each) => ({
        value: each.id,
        label: printDay(each.takenOn),
        inList: `${printDay(each.takenOn)}, ${each.takenBy === 'self' ? 'by oneself' : 'by another'}`,
      }))}
      onChange={(setId) => change({ set: setId })}
    />
  );
}

interface PatternWordProps {
  pattern: { id: string; title: string } | null;
}

/** Which pattern: choosing one takes its latest tables, and its own silhouette. */
export function PatternWord({ pattern }: PatternWordProps) {
  const change = useSettingChange();
  const { data: patterns } = useQuery(patternsQuery());
  const options: SentenceOption[] = (patterns?.items ?? []).map((each) => ({
    value: each.id,
    label: each.title,
    ...(each.maker !== '' && { inList: `${each.title}, ${each.maker}` }),
  }));
  if (pattern && !options.some((option) => option.value === pattern.id)) {
    options.unshift({ value: pattern.id, label: pattern.title });
  }
  return (
    <SentenceSelect
      label="Pattern"
      placeholder="a pattern"
      value={pattern?.id ?? ''}
      options={options}
      onChange={(patternId) => {
        const next = patterns?.items.find((each) => each.id === patternId);
        if (next) change({ revision: next.latestRevisionId, silhouette: null });
      }}
    />
  );
}
