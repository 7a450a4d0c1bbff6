/** A stretch of a line that is already taken, in px. */
export interface Taken {
  from: number;
  to: number;
}

/** A label that would like to stand at `x`, `width` wide; a lower rank goes first. */
export interface WantedLabel {
  key: string;
  x: number;
  width: number;
  rank: number;
}

/**
 * Which labels can stand on one line without touching one another, what is taken, or the ends of the line. A label
 * that has no room is left out: its tick still stands.
 */
export function placeLabels(
  wanted: readonly WantedLabel[],
  taken: readonly Taken[],
  line: Taken,
  gap = 4,
): Set<string> {
  const occupied = [...taken];
  const placed = new Set<string>();
  for (const label of [...wanted].sort((a, b) => a.rank - b.rank)) {
    const from = label.x - label.width / 2;
    const to = label.x + label.width / 2;
    if (from < line.from || to > line.to) continue;
    if (occupied.some((other) => from - gap < other.to && to + gap > other.from)) continue;
    occupied.push({ from, to });
    placed.add(label.key);
  }
  return placed;
}

/** About how wide a text is in the page's font, in px: exact enough to keep labels apart. */
export function textWidth(text: string, fontSize: number): number {
  return text.length * fontSize * 0.62;
}
