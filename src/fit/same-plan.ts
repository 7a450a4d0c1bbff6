/** Arc tangents differ in their last bits between one JavaScript engine and another; a micrometre is nothing. */
const NOTHING = 1e-3;

/** Whether two answers say the same, whatever the order of their keys; a missing key is an undefined one. */
export function saysTheSame(one: unknown, other: unknown): boolean {
  if (one === other) return true;
  if (typeof one === 'number' && typeof other === 'number') return Math.abs(one - other) <= NOTHING;
  if (Array.isArray(one) && Array.isArray(other)) {
    return one.length === other.length && one.every((each, index) => saysTheSame(each, other[index]));
  }
  if (!isRecord(one) || !isRecord(other)) return false;
  const keys = new Set([...Object.keys(one), ...Object.keys(other)]);
  return [...keys].every((key) => saysTheSame(one[key], other[key]));
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
