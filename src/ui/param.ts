import type { Params } from 'react-router-dom';

/** A part of the address that the route cannot be reached without. */
export function param(params: Params, name: string): string {
  const value = params[name];
  if (value === undefined) throw new Error(`The route has no :${name}`);
  return value;
}
