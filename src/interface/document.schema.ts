import { z } from 'zod';
import { ROLES } from '../../shared/me.ts';

/** A JSON Schema (2020-12), of which the page reads what it has words for. */
export interface JsonSchema {
  $ref?: string | undefined;
  type?: string | string[] | undefined;
  format?: string | undefined;
  description?: string | undefined;
  enum?: unknown[] | undefined;
  const?: unknown;
  default?: unknown;
  properties?: Record<string, JsonSchema> | undefined;
  required?: string[] | undefined;
  additionalProperties?: boolean | JsonSchema | undefined;
  items?: JsonSchema | undefined;
  prefixItems?: JsonSchema[] | undefined;
  anyOf?: JsonSchema[] | undefined;
  oneOf?: JsonSchema[] | undefined;
  allOf?: JsonSchema[] | undefined;
  minimum?: number | undefined;
  maximum?: number | undefined;
  exclusiveMinimum?: number | undefined;
  minLength?: number | undefined;
  maxLength?: number | undefined;
  minItems?: number | undefined;
  maxItems?: number | undefined;
}

const schema: z.ZodType<JsonSchema> = z.lazy(() =>
  z.object({
    $ref: z.string().optional(),
    type: z.union([z.string(), z.array(z.string())]).optional(),
    format: z.string().optional(),
    description: z.string().optional(),
    enum: z.array(z.unknown()).optional(),
    const: z.unknown().optional(),
    default: z.unknown().optional(),
    properties: z.record(z.string(), schema).optional(),
    required: z.array(z.string()).optional(),
    additionalProperties: z.union([z.boolean(), schema]).optional(),
    items: schema.optional(),
    prefixItems: z.array(schema).optional(),
    anyOf: z.array(schema).optional(),
    oneOf: z.array(schema).optional(),
    allOf: z.array(schema).optional(),
    minimum: z.number().optional(),
    maximum: z.number().optional(),
    exclusiveMinimum: z.number().optional(),
    minLength: z.number().optional(),
    maxLength: z.number().optional(),
    minItems: z.number().optional(),
    maxItems: z.number().optional(),
  }),
);

const content = z.record(z.string(), z.object({ schema: schema.optional() }));

const operationSchema = z.object({
  operationId: z.string(),
  summary: z.string(),
  tags: z.array(z.string()),
  'x-who': z.enum(['anyone', ...ROLES]),
  security: z.array(z.record(z.string(), z.array(z.string()))),
  parameters: z
    .array(z.object({ name: z.string(), in: z.string(), required: z.boolean().default(false), schema }))
    .default([]),
  requestBody: z.object({ required: z.boolean().default(false), content }).optional(),
  responses: z.record(z.string(), z.object({ description: z.string(), content: content.optional() })),
});

/** What one route is, as the description has it. */
export type Operation = z.infer<typeof operationSchema>;

/** An OpenAPI 3.1 description, as far as the page shows it. */
export const documentSchema = z.object({
  openapi: z.string().startsWith('3.1'),
  info: z.object({ title: z.string(), version: z.string(), description: z.string().default('') }),
  tags: z.array(z.object({ name: z.string() })),
  paths: z.record(z.string(), z.record(z.string(), operationSchema)),
  components: z.object({ schemas: z.record(z.string(), schema) }),
});
export type InterfaceDocument = z.infer<typeof documentSchema>;
