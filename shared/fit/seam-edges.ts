import { MEASURES } from '../points/measures.ts';
import type { PointId } from '../points/point-ids.ts';
import type { ZoneId } from './fit-words.ts';

/**
 * Over how many seam edges a change at a point is shared where the pattern does not say: two side seams are four edges
 * (Robinson, on-line costume textbook, ch. 17, Central Washington Univ.). A leg has an inside and an outside seam,
 * four edges; a sleeve one seam, two edges; a width and a neckline their two ends (common practice).
 */
export function defaultSeamEdges(point: PointId, zone: ZoneId): number {
  if (MEASURES[point].kind !== 'girth') return 2;
  return zone === 'neck' || zone === 'sleeve' ? 2 : 4;
}
