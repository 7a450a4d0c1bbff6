import { SILHOUETTES, ZONE_IDS, type Silhouette, type ZoneId } from '../../shared/fit/fit-words.ts';
import { labelBetween } from '../../shared/fit/between-lines.ts';
import type { Held } from './parts/fitting.ts';

/** What the address of a fit view asks for: `?set=…&revision=…&silhouette=loose&cut=between&hold=hip:18`. */
export interface FitAddress {
  setId: string | null;
  revisionId: string | null;
  silhouette: Silhouette | null;
  /** Whether it may be cut between the lines too. */
  isBetween: boolean;
  /** Held sizes by their labels, which stay meaningful where a size is added to the pattern. */
  hold: readonly string[];
}

export function readFitAddress(search: URLSearchParams): FitAddress {
  const silhouette = SILHOUETTES.find((each) => each === search.get('silhouette')) ?? null;
  return {
    setId: readId(search, 'set'),
    revisionId: readId(search, 'revision'),
    silhouette,
    isBetween: search.get('cut') === 'between',
    hold: search.getAll('hold'),
  };
}

/**
 * Reads held sizes against a pattern's labels; what names no zone or no size of it is left out, and what lies between
 * two sizes unless it is cut there.
 */
export function readHeld(
  hold: readonly string[],
  sizes: readonly string[],
  zones: readonly ZoneId[],
  isBetween = false,
): Held {
  const held: Held = {};
  for (const text of hold) {
    const cut = text.indexOf(':');
    const zone = ZONE_IDS.find((each) => each === text.slice(0, cut));
    const position = positionOf(text.slice(cut + 1), sizes, isBetween);
    if (zone && zones.includes(zone) && position !== null) held[zone] = position;
  }
  return held;
}

/** The address with these sizes held and no others. */
export function writeHeld(search: URLSearchParams, held: Held, sizes: readonly string[]): URLSearchParams {
  const next = new URLSearchParams(search);
  next.delete('hold');
  for (const zone of ZONE_IDS) {
    const position = held[zone];
    const label = position === undefined ? undefined : labelAt(sizes, position);
    if (label !== undefined) next.append('hold', `${zone}:${label}`);
  }
  return next;
}

/** A size's own label first: a pattern may call a size `16–18` itself. */
function positionOf(label: string, sizes: readonly string[], isBetween: boolean): number | null {
  const whole = sizes.indexOf(label);
  if (whole !== -1) return whole;
  const before = isBetween ? sizes.findIndex((_, at) => labelAt(sizes, at + 0.5) === label) : -1;
  return before === -1 ? null : before + 0.5;
}

function labelAt(sizes: readonly string[], position: number): string | undefined {
  const smaller = sizes[Math.floor(position)];
  const larger = sizes[Math.ceil(position)];
  if (smaller === undefined || larger === undefined) return undefined;
  return smaller === larger ? smaller : labelBetween(smaller, larger);
}

const UUID = /^[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** An id that is none would only be refused by the server: it counts as not chosen. */
function readId(search: URLSearchParams, name: string): string | null {
  const id = search.get(name);
  return id !== null && UUID.test(id) ? id : null;
}
