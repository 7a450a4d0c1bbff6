import { z } from 'zod';

export type JsonSchema = Record<string, unknown>;

/** `sent` is what comes in, where what has a default may be left out; `answered` is what goes out. */
export type Direction = 'sent' | 'answered';

/** Turns schemas into JSON Schema; those with a name stand once, under `components`, and are referred to. */
export interface JsonSchemas {
  of: (schema: z.core.$ZodType, direction: Direction) => JsonSchema;
  /** Gives the named schemas that were used, and what refers to them, their final names. */
  settle: <T>(value: T) => { value: T; components: Record<string, JsonSchema> };
}

type Named = Record<string, z.core.$ZodType>;

const HOME = '#/components/schemas/';
const IO = { sent: 'input', answered: 'output' } as const;
const ALONE = '(alone)';

export function jsonSchemas(named: Named): JsonSchemas {
  const whole = { sent: written(named, 'sent'), answered: written(named, 'answered') };
  const names = new Map(Object.entries(named).map(([name, schema]) => [schema, name]));
  /** By `direction:name`, which is what a reference says until `settle`. */
  const used = new Map<string, JsonSchema>();

  function noted(schema: JsonSchema, direction: Direction): JsonSchema {
    for (const [, name = ''] of JSON.stringify(schema).matchAll(/"#\/components\/schemas\/\w+:(\w+)"/g)) {
      need(name, direction);
    }
    return schema;
  }
  function need(name: string, direction: Direction): void {
    const key = `${direction}:${name}`;
    const schema = whole[direction][name] ?? {};
    if (used.has(key)) return;
    used.set(key, schema);
    noted(schema, direction);
  }

  return {
    of(schema, direction) {
      const own = names.get(schema);
      const found =
        own === undefined
          ? written({ ...named, [ALONE]: schema }, direction)[ALONE]
          : { $ref: `${HOME}${direction}:${own}` };
      return noted(found ?? {}, direction);
    },
    settle: (value) => settle(value, used),
  };
}

/** JSON Schemas by name, referring to each other as `direction:name`. */
function written(named: Named, direction: Direction): Record<string, JsonSchema> {
  const registry = z.registry<{ id: string }>();
  for (const [id, schema] of Object.entries(named)) registry.add(schema, { id });
  const { schemas } = z.toJSONSchema(registry, {
    io: IO[direction],
    uri: (id) => `${HOME}${direction}:${id}`,
    override: ({ jsonSchema }) => {
      // Every whole number is bounded by what a double can count to: that is no limit of ours.
      if (jsonSchema.minimum === Number.MIN_SAFE_INTEGER) delete jsonSchema.minimum;
      if (jsonSchema.maximum === Number.MAX_SAFE_INTEGER) delete jsonSchema.maximum;
    },
  });
  return Object.fromEntries(
    Object.entries(schemas).map(([name, { $schema: _dialect, $id: _address, id: _id, ...schema }]) => [
      name,
      schema,
    ]),
  );
}

/**
 * A schema that is used one way only keeps its name; one that is used both ways and says different things is two,
 * and what is sent gets the longer name.
 */
function settle<T>(value: T, used: ReadonlyMap<string, JsonSchema>) {
  const isTwofold = new Set(
    [...used.keys()]
      .map((key) => key.slice(key.indexOf(':') + 1))
      .filter((name) => used.has(`sent:${name}`) && used.has(`answered:${name}`))
      .filter((name) => !isSame(name, used)),
  );
  const finalName = (direction: string, name: string) =>
    direction === 'sent' && isTwofold.has(name) ? `${name}AsSent` : name;
  const renamed = <S>(part: S): S =>
    JSON.parse(
      JSON.stringify(part).replace(
        /"#\/components\/schemas\/(\w+):(\w+)"/g,
        (_all, direction: string, name: string) => `"${HOME}${finalName(direction, name)}"`,
      ),
    ) as S;
  const components = [...used].map(([key, schema]): [string, JsonSchema] => {
    const [direction = '', name = ''] = key.split(':');
    return [finalName(direction, name), renamed(schema)];
  });
  const inOrder = components.sort(([a], [b]) => (a < b ? -1 : 1));
  return { value: renamed(value), components: Object.fromEntries(inOrder) };
}

/** Whether a schema and all that it refers to say the same both ways. */
function isSame(name: string, used: ReadonlyMap<string, JsonSchema>, seen = new Set<string>()): boolean {
  if (seen.has(name)) return true;
  seen.add(name);
  const sent = JSON.stringify(used.get(`sent:${name}`) ?? {});
  const answered = JSON.stringify(used.get(`answered:${name}`) ?? {});
  const inner = [...sent.matchAll(/"#\/components\/schemas\/sent:(\w+)"/g)].map(([, other = '']) => other);
  return (
    sent.replaceAll(`${HOME}sent:`, `${HOME}answered:`) === answered &&
    inner.every((other) => isSame(other, used, seen))
  );
}
