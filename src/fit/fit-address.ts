import { SILHOUETTES, ZONE_IDS, type Silhouette, type ZoneId } from '../../shared/fit/fit-words.ts';
import type { Held } from './parts/fitting.ts';

/** What the address of a fit view asks for: `?set=…&revision=…&silhouette=loose&hold=hip:18`. */
export interface FitAddress {
  setId: string | null;
  revisionId: string | null;
  silhouette: Silhouette | null;
  /** Held sizes by their labels, which stay meaningful where a size is added to the pattern. */
  hold: readonly string[];
}

export function readFitAddress(search: URLSearchParams): FitAddress {
  const silhouette = SILHOUETTES.find((each) => each === search.get('silhouette')) ?? null;
  return {
    setId: readId(search, 'set'),
    revisionId: readId(search, 'revision'),
    silhouette,
    hold: search.getAll('hold'),
  };
}

/** Reads held sizes against a pattern's labels; what names no zone or no size of it is left out. */
export function readHeld(hold: readonly string[], sizes: readonly string[], zones: readonly ZoneId[]): Held {
  const held: Held = {};
  for (const text of hold) {
    const cut = text.indexOf(':');
    const zone = ZONE_IDS.find((each) => each === text.slice(0, cut));
    const position = sizes.indexOf(text.slice(cut + 1));
    if (zone && zones.includes(zone) && position !== -1) held[zone] = position;
  }
  return held;
}

/** The address with these sizes held and no others. */
export function writeHeld(search: URLSearchParams, held: Held, sizes: readonly string[]): URLSearchParams {
  const next = new URLSearchParams(search);
  next.delete('hold');
  for (const zone of ZONE_IDS) {
    const position = held[zone];
    const label = position === undefined ? undefined : sizes[position];
    if (label !== undefined) next.append('hold', `${zone}:${label}`);
  }
  return next;
}

const UUID = /^[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** An id that is none would only be refused by the server: it counts as not chosen. */
function readId(search: URLSearchParams, name: string): string | null {
  const id = search.get(name);
  return id !== null && UUID.test(id) ? id : null;
}
