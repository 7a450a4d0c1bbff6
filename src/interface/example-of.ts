import type { JsonSchema } from './document.schema.ts';
import { shapeName } from './say-schema.ts';

const TEXTS: Record<string, string> = {
  uuid: '0190a000-0000-7000-8000-000000000001',
  'date-time': '2026-10-12T09:30:00Z',
  date: '2026-10-12',
  email: 'name@example.org',
};

/** The smallest value that has a schema's shape: only what must be there, the first of several choices. */
export function exampleOf(schema: JsonSchema, shapes: Record<string, JsonSchema>, depth = 0): unknown {
  if (depth > 8) return null;
  const next = (part: JsonSchema) => exampleOf(part, shapes, depth + 1);
  if (schema.$ref !== undefined) return next(shapes[shapeName(schema.$ref)] ?? {});
  if (schema.const !== undefined) return schema.const;
  if (schema.default !== undefined) return schema.default;
  if (schema.enum !== undefined) return schema.enum[0];
  const choice = (schema.anyOf ?? schema.oneOf)?.[0];
  if (choice !== undefined) return next(choice);
  const type = Array.isArray(schema.type) ? schema.type[0] : schema.type;
  if (type === 'array') return (schema.minItems ?? 0) > 0 && schema.items ? [next(schema.items)] : [];
  if (type === 'object') {
    const names = schema.required ?? [];
    return Object.fromEntries(names.map((name) => [name, next(schema.properties?.[name] ?? {})]));
  }
  if (type === 'string') return TEXTS[schema.format ?? ''] ?? '…';
  if (type === 'number' || type === 'integer') return schema.minimum ?? 1;
  if (type === 'boolean') return true;
  return null;
}
