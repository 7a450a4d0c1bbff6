/** A JSON pointer (RFC 6901) to where the path leads: `['typed', 'hip']` is `/typed/hip`. */
export function pointerTo(path: readonly PropertyKey[]): string {
  return path.map((step) => `/${String(step).replace(/~/g, '~0').replace(/\//g, '~1')}`).join('');
}
