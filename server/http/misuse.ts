import { invalid } from './problem.ts';

/** Runs a reckoning; a RangeError, by which numeric code says that it was given nonsense, becomes 422 at the pointer. */
export function reckon<T>(pointer: string, work: () => T): T {
  try {
    return work();
  } catch (error) {
    if (error instanceof RangeError) {
      throw invalid([{ pointer, detail: `This cannot be reckoned with: ${error.message}.` }]);
    }
    throw error;
  }
}
