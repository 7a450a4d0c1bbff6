/**
 * An array for so many numbers, to be written before it is read. Its first number is a fraction, so that the machine
 * keeps the numbers themselves and not references to them; it is made several times faster than a typed array of this
 * size, and unlike one it costs the garbage collector nothing.
 */
export function doubles(count: number): number[] {
  const numbers = new Array<number>(count);
  if (count > 0) numbers[0] = 0.5;
  return numbers;
}
