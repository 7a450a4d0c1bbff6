import type { InterfaceDocument } from './document.schema.ts';
import { exampleOf } from './example-of.ts';
import type { DescribedRoute } from './routes-of.ts';

/** Single quotes keep everything from the shell but a single quote itself. */
const quoted = (text: string): string => `'${text.replaceAll("'", `'\\''`)}'`;

/** How a shell asks this route, with a token in `LEEWAY_TOKEN`; null where only a browser may ask. */
export function curlOf(
  route: DescribedRoute,
  shapes: InterfaceDocument['components']['schemas'],
  origin: string,
): string | null {
  if (route.scope === null && (route['x-who'] !== 'anyone' || route.path.startsWith('/api/auth/')))
    return null;
  const path = route.path.replace(/\{(\w+)\}/g, (_all, name: string) => {
    const schema = route.parameters.find((one) => one.in === 'path' && one.name === name)?.schema;
    return schema?.enum === undefined ? name.toUpperCase() : String(schema.enum[0]);
  });
  const parts = [`curl ${route.method === 'GET' ? '' : `-X ${route.method} `}${quoted(origin + path)}`];
  if (route.scope !== null) parts.push('-H "Authorization: Bearer $LEEWAY_TOKEN"');
  const content = route.requestBody?.content ?? {};
  const json = content['application/json']?.schema;
  const field = Object.keys(content['multipart/form-data']?.schema?.properties ?? {})[0];
  if (json !== undefined) {
    parts.push("-H 'Content-Type: application/json'");
    parts.push(`-d ${quoted(JSON.stringify(exampleOf(json, shapes)))}`);
  }
  if (field !== undefined) parts.push(`-F ${quoted(`${field}=@table.csv`)}`);
  return parts.join(' \\\n  ');
}
