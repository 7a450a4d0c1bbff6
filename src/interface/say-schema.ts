import type { JsonSchema } from './document.schema.ts';

const FORMATS: Record<string, string> = {
  uuid: 'id',
  'date-time': 'moment',
  date: 'day',
  email: 'e-mail address',
  uri: 'web address',
};

/** The name of the shape that a reference leads to. */
export const shapeName = (ref: string): string => ref.split('/').at(-1) ?? ref;

/** A kind of value in words, where a word or two are enough; its fields are told apart. */
export function sayKind(schema: JsonSchema): string {
  if (schema.$ref !== undefined) return shapeName(schema.$ref);
  if (schema.const !== undefined) return JSON.stringify(schema.const);
  if (schema.enum !== undefined) return schema.enum.map((value) => JSON.stringify(value)).join(' or ');
  const choices = schema.anyOf ?? schema.oneOf;
  if (choices !== undefined) return choices.map(sayKind).join(' or ');
  if (Array.isArray(schema.type)) {
    return schema.type.map((type) => sayKind({ ...schema, type })).join(' or ');
  }
  switch (schema.type) {
    case 'array':
      return `list${limits(schema.minItems, schema.maxItems, ' of them')} of ${schema.items ? sayKind(schema.items) : 'anything'}`;
    case 'string':
      return (
        (schema.format === undefined ? 'text' : (FORMATS[schema.format] ?? schema.format)) +
        (schema.format === undefined ? limits(schema.minLength, schema.maxLength, ' characters') : '')
      );
    case 'integer':
      return `whole number${limits(schema.minimum ?? schema.exclusiveMinimum, schema.maximum)}`;
    case 'number':
      return `number${limits(schema.minimum ?? schema.exclusiveMinimum, schema.maximum)}`;
    case 'boolean':
      return 'true or false';
    case 'null':
      return 'null';
    case 'object':
      return schema.properties === undefined && typeof schema.additionalProperties === 'object'
        ? `${sayKind(schema.additionalProperties)} by name`
        : 'object';
    default:
      return schema.allOf === undefined ? 'anything' : schema.allOf.map(sayKind).join(' and ');
  }
}

function limits(low: number | undefined, high: number | undefined, unit = ''): string {
  if (low === undefined && high === undefined) return '';
  if (low === undefined) return ` (up to ${high ?? ''}${unit})`;
  if (high === undefined) return ` (from ${low}${unit})`;
  return ` (${low} to ${high}${unit})`;
}

/** Every shape that a schema names, itself or within; a list, a choice or an object may name several. */
export function shapesIn(schema: JsonSchema): string[] {
  const inner = [
    schema.items,
    ...(schema.prefixItems ?? []),
    ...(schema.anyOf ?? []),
    ...(schema.oneOf ?? []),
    ...(schema.allOf ?? []),
    ...(typeof schema.additionalProperties === 'object' ? [schema.additionalProperties] : []),
  ].filter((part) => part !== undefined);
  const own = schema.$ref === undefined ? [] : [shapeName(schema.$ref)];
  return [...new Set([...own, ...inner.flatMap(shapesIn)])];
}

/** The object whose fields are worth telling: the schema itself, what it is a list of, or the one choice that is one. */
export function objectIn(schema: JsonSchema): JsonSchema | null {
  if (schema.properties !== undefined) return schema;
  if (schema.items !== undefined) return objectIn(schema.items);
  if (typeof schema.additionalProperties === 'object') return objectIn(schema.additionalProperties);
  const objects = [...(schema.anyOf ?? []), ...(schema.oneOf ?? []), ...(schema.allOf ?? [])]
    .map(objectIn)
    .filter((part) => part !== null);
  return objects.length === 1 ? (objects[0] ?? null) : null;
}
