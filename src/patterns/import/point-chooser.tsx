import { memo } from 'react';
import { CATALOGUE, POINT_GROUP_NAMES } from '../../../shared/points/catalogue.ts';
import { POINT_GROUPS } from '../../../shared/points/catalogue-point.ts';
import { POINT_IDS, type PointId } from '../../../shared/points/point-ids.ts';

const GROUPS = POINT_GROUPS.map((group) => ({
  name: POINT_GROUP_NAMES[group],
  points: POINT_IDS.filter((point) => CATALOGUE[point].group === group),
}));

const OUT = 'out';

interface PointChooserProps {
  id: string;
  label: string;
  describedBy: string;
  point: PointId | null;
  onChoose: (point: PointId | null) => void;
}

/** Which point of measure a column is, of the whole catalogue, or that it is left out. */
export const PointChooser = memo(function PointChooser(props: PointChooserProps) {
  const { id, label, describedBy, point, onChoose } = props;
  return (
    <select
      id={id}
      aria-label={label}
      aria-describedby={describedBy}
      value={point ?? OUT}
      onChange={(event) => onChoose(POINT_IDS.find((known) => known === event.target.value) ?? null)}
      className={`field-line w-48! bg-paper font-semibold ${point === null ? 'text-ink-2' : ''}`}
    >
      <option value={OUT}>Leave this column out</option>
      {GROUPS.map(({ name, points }) => (
        <optgroup key={name} label={name}>
          {points.map((each) => (
            <option key={each} value={each}>
              {CATALOGUE[each].name}
            </option>
          ))}
        </optgroup>
      ))}
    </select>
  );
});
