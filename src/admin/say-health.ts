/** “3 days and 4 hours”, “12 minutes”: the two largest parts of a time, in seconds; less than a minute is “less than a minute”. */
export function sayDuration(seconds: number): string {
  const parts: [number, string][] = [
    [Math.floor(seconds / 86_400), 'day'],
    [Math.floor(seconds / 3600) % 24, 'hour'],
    [Math.floor(seconds / 60) % 60, 'minute'],
  ];
  const first = parts.findIndex(([count]) => count > 0);
  if (first === -1) return 'less than a minute';
  return parts
    .slice(first, first + 2)
    .filter(([count]) => count > 0)
    .map(([count, word]) => `${count} ${word}${count === 1 ? '' : 's'}`)
    .join(' and ');
}

/** Bytes in the largest unit that keeps a figure before the point: `12.3 GB` (powers of 1000). */
export function sayBytes(bytes: number): string {
  const units = ['bytes', 'kB', 'MB', 'GB', 'TB'];
  let value = bytes;
  let unit = 0;
  while (value >= 1000 && unit < units.length - 1) {
    value /= 1000;
    unit += 1;
  }
  return `${unit === 0 ? value : value.toFixed(1)} ${units[unit] ?? ''}`;
}
