import { z } from 'zod';
import type { InterfaceDocument, Operation } from '../../server/openapi/document.ts';

/** A response as the document describes it. */
const responseSchema = z.object({
  content: z.record(z.string(), z.object({ schema: z.looseObject({}).optional() })).optional(),
});

/** What is not as the description says of an answer; empty where all is. */
export function unlikeDescription(
  document: InterfaceDocument,
  operation: Operation,
  answer: { status: number; type: string; body: unknown },
): string[] {
  const described = operation.responses[answer.status];
  if (described === undefined) return [`status ${answer.status} is not described`];
  const { content } = responseSchema.parse(described);
  if (content === undefined)
    return answer.type === '' ? [] : [`a body of type ${answer.type} is not described`];
  const body = content[answer.type];
  if (body === undefined) return [`the type ${answer.type} is not described`];
  if (body.schema === undefined) return [];
  const result = readerOf(document, body.schema).safeParse(answer.body);
  return (result.error?.issues ?? []).map((issue) => `${issue.path.join('.')}: ${issue.message}`);
}

const readers = new Map<string, z.ZodType>();

/** Reads what the published JSON Schema allows: from the text that a program would read, not from our own schema. */
function readerOf(document: InterfaceDocument, schema: object): z.ZodType {
  const text = JSON.stringify(schema);
  const known = readers.get(text);
  if (known !== undefined) return known;
  const { schemas } = document['components'] as { schemas: object };
  const whole = JSON.stringify({ ...schema, $defs: schemas }).replaceAll('#/components/schemas/', '#/$defs/');
  const reader = z.fromJSONSchema(JSON.parse(whole) as Parameters<typeof z.fromJSONSchema>[0]);
  readers.set(text, reader);
  return reader;
}
