import type { Express } from 'express';
import { z } from 'zod';

/** What Express keeps of a route and of a router within a router. */
const layerSchema = z.object({
  slash: z.boolean(),
  route: z.object({ path: z.string(), methods: z.record(z.string(), z.boolean()) }).optional(),
  handle: z.unknown(),
});
const stackSchema = z.array(layerSchema);

/** Every route that Express would try, as `METHOD /address`; those that answer to any method or lie under a prefix fail. */
export function registeredRoutes(app: Express): string[] {
  return routesIn(stackSchema.parse(app.router.stack));
}

function routesIn(layers: z.infer<typeof layerSchema>[]): string[] {
  return layers.flatMap(({ route, handle, slash }) => {
    if (route !== undefined) return keysOf(route);
    const inner = typeof handle === 'function' && 'stack' in handle ? handle.stack : [];
    const keys = routesIn(stackSchema.parse(inner));
    if (keys.length > 0 && !slash) throw new Error(`${keys.join(', ')}: written without its whole address.`);
    return keys;
  });
}

function keysOf({ path, methods }: { path: string; methods: Record<string, boolean> }): string[] {
  const names = Object.keys(methods);
  if (names.includes('_all')) throw new Error(`${path} answers to every method.`);
  return names.map((name) => `${name.toUpperCase()} ${path}`);
}
