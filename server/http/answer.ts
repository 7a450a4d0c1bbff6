import * as z from 'zod/mini';

/**
 * What may leave: the value through the route's output schema, which drops every column it does not name.
 * A value that does not fit its own schema is our mistake, and is thrown as such.
 */
export function answer<T extends z.core.$ZodType>(schema: T, value: z.input<T>): z.output<T> {
  const result = z.safeParse(schema, value);
  if (result.success) return result.data;
  const where = result.error.issues.map((issue) => `${issue.path.map(String).join('.')} (${issue.code})`);
  throw new Error(`An answer does not fit its schema: ${where.slice(0, 5).join(', ')}`);
}
