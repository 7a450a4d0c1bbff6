/** Stands in the names of the owner's records: no answer to anybody else may hold it. */
export const MARKER = 'only the owner may read this';
