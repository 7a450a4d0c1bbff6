import { CATALOGUE, MEASURING_ORDER, POINT_GROUP_NAMES } from '../../shared/points/catalogue.ts';
import type { PointGroup } from '../../shared/points/catalogue-point.ts';
import type { PointId } from '../../shared/points/point-ids.ts';

/** The girths of the torso that nearly every pattern gives: what to take first. */
export const BASIC_POINTS: readonly PointId[] = MEASURING_ORDER.filter((point) =>
  ['waist', 'upperBust', 'bust', 'hip'].includes(point),
);

interface Group {
  id: PointGroup;
  name: string;
  points: PointId[];
}

/** All other points by the part of the body they are on, groups and points in measuring order. */
export const FURTHER_GROUPS: readonly Group[] = (() => {
  const groups = new Map<PointGroup, Group>();
  for (const point of MEASURING_ORDER) {
    if (BASIC_POINTS.includes(point)) continue;
    const id = CATALOGUE[point].group;
    const group = groups.get(id) ?? { id, name: POINT_GROUP_NAMES[id], points: [] };
    group.points.push(point);
    groups.set(id, group);
  }
  return [...groups.values()];
})();
