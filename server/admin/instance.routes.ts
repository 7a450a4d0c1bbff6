import { statfs } from 'node:fs/promises';
import { Router } from 'express';
import about from '../../package.json' with { type: 'json' };
import { adminHealthSchema } from '../../shared/admin/health.schema.ts';
import { adminReferenceSchema } from '../../shared/admin/reference.schema.ts';
import type { PoolUse } from '../db/client.ts';
import { answer } from '../http/answer.ts';
import type { RouteDeps } from '../http/deps.ts';
import type { Metrics } from '../http/metrics.ts';
import { requireAdmin } from './admin.policy.ts';
import { carriedReference } from './carried-reference.ts';
import { databaseHealth, mailHealth } from './instance.store.ts';

interface InstanceDeps extends RouteDeps {
  dataFolder: string;
  metrics: Metrics;
  /** Null where the pool is not ours to look into. */
  poolUse: (() => PoolUse) | null;
}

/** How this instance is doing, and the figures it carries. */
export function instanceRoutes(deps: InstanceDeps): Router {
  const { db, requireUser, metrics, poolUse, dataFolder } = deps;
  const router = Router();

  router.get('/api/admin/health', async (request, reply) => {
    requireAdmin(await requireUser(request));
    const disk = await statfs(dataFolder);
    const health = {
      version: about.version,
      startedAt: new Date(performance.timeOrigin).toISOString(),
      uptimeSeconds: Math.floor(process.uptime()),
      database: await databaseHealth(db),
      disk: { freeBytes: disk.bavail * disk.bsize, totalBytes: disk.blocks * disk.bsize },
      mail: await mailHealth(db),
    };
    reply.json(answer(adminHealthSchema, health));
  });

  router.get('/api/admin/reference', async (request, reply) => {
    requireAdmin(await requireUser(request));
    reply.json(answer(adminReferenceSchema, carriedReference()));
  });

  router.get('/api/metrics', async (request, reply) => {
    requireAdmin(await requireUser(request));
    reply.type('text/plain; version=0.0.4; charset=utf-8').send(metrics.write(poolUse?.() ?? null));
  });
  return router;
}
