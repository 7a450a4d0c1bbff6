/** One measured figure, as `npm run bench` prints it. */
export interface Figure {
  name: string;
  value: number;
  unit: string;
  /** Against a reference run side by side; null where there is none. */
  ratio: number | null;
  /** What the reference is. */
  reference: string | null;
}
