import type { DetailsValues } from '../details-values.ts';

const keyOf = (draftId: string) => `leeway import ${draftId}`;

/**
 * What was typed and has not reached the server yet, kept in this tab: a reload, a lost connection or a field the
 * server refuses costs nothing. A browser without such storage only loses this second net.
 */
export function keepTyping(draftId: string, values: DetailsValues) {
  try {
    sessionStorage.setItem(keyOf(draftId), JSON.stringify(values));
  } catch {
    // Full or forbidden: the server's draft remains.
  }
}

export function forgetTyping(draftId: string) {
  try {
    sessionStorage.removeItem(keyOf(draftId));
  } catch {
    // Nothing was kept.
  }
}

/** The values with what was kept laid over them; anything that is not of their shape is passed over. */
export function withKeptTyping(
  draftId: string,
  values: DetailsValues,
): { values: DetailsValues; isKept: boolean } {
  const kept = readKept(draftId);
  if (kept === null) return { values, isKept: false };
  const texts = Object.fromEntries(
    Object.entries(values).flatMap(([name, value]) => {
      const other = kept[name];
      return typeof value === 'string' && typeof other === 'string' ? [[name, other]] : [];
    }),
  );
  const edges = kept['seamEdges'];
  const seamEdges = { ...values.seamEdges };
  if (isRecord(edges)) {
    for (const level of ['bust', 'waist', 'hip'] as const) {
      const text = edges[level];
      if (typeof text === 'string') seamEdges[level] = text;
    }
  }
  return { values: { ...values, ...texts, seamEdges }, isKept: true };
}

function readKept(draftId: string): Record<string, unknown> | null {
  try {
    const value: unknown = JSON.parse(sessionStorage.getItem(keyOf(draftId)) ?? 'null');
    return isRecord(value) ? value : null;
  } catch {
    return null;
  }
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null;
