import { hostname } from 'node:os';
import { monitorEventLoopDelay } from 'node:perf_hooks';
import type { Request, RequestHandler } from 'express';
import type { PoolUse } from '../db/client.ts';

/** Upper ends of the duration histogram, in seconds. */
const BUCKETS = [0.005, 0.01, 0.025, 0.05, 0.1, 0.25, 0.5, 1, 2.5, 5, 10];
const QUANTILES = [0.5, 0.9, 0.99];
const NS = 1e9;

interface Durations {
  counts: number[];
  sum: number;
  total: number;
}

export interface Metrics {
  /** Counts every answer by the pattern of its route, never by the address itself. */
  count: RequestHandler;
  /** Everything counted so far in the text exposition format, version 0.0.4. */
  write: (pool: PoolUse | null) => string;
}

/** The figures of this one process: it keeps no other's, and each line names it. */
export function createMetrics(): Metrics {
  const requests = new Map<string, number>();
  const durations = new Map<string, Durations>();
  const process = `process="${escape(`${hostname()}:${String(globalThis.process.pid)}`)}"`;
  const delay = monitorEventLoopDelay({ resolution: 10 });
  delay.enable();

  const count: RequestHandler = (request, response, next) => {
    const began = performance.now();
    const { method } = request;
    response.once('close', () => {
      const labels = `method="${escape(method)}",route="${escape(routeOf(request))}"`;
      const answered = `${labels},status="${response.writableFinished ? response.statusCode : 'none'}"`;
      requests.set(answered, (requests.get(answered) ?? 0) + 1);
      observe(durations, labels, (performance.now() - began) / 1000);
    });
    next();
  };

  const write = (pool: PoolUse | null): string => {
    const lines = [
      ...family(
        'leeway_http_requests_total',
        'counter',
        'Requests answered by this process (status none: cut off).',
      ),
      ...[...requests].map(([labels, n]) => `leeway_http_requests_total{${labels},${process}} ${n}`),
      ...family('leeway_http_request_duration_seconds', 'histogram', 'From the first line to the last byte.'),
      ...[...durations].flatMap(([labels, one]) => writeHistogram(`${labels},${process}`, one)),
      ...family(
        'leeway_event_loop_delay_seconds',
        'gauge',
        'Delay of the event loop since this was last read.',
      ),
      ...QUANTILES.map(
        (q) =>
          `leeway_event_loop_delay_seconds{quantile="${q}",${process}} ${seconds(delay.percentile(q * 100))}`,
      ),
      `leeway_event_loop_delay_seconds{quantile="1",${process}} ${seconds(delay.max)}`,
      ...(pool === null ? [] : writePool(pool, process)),
      ...writeProcess(process),
    ];
    delay.reset();
    return `${lines.join('\n')}\n`;
  };
  return { count, write };
}

/** The pattern that Express matched; what matched none is one of two words, so that no address makes a line of its own. */
function routeOf(request: Request): string {
  const route = request.route as { path?: unknown } | undefined;
  if (typeof route?.path === 'string') return route.path;
  return request.originalUrl.startsWith('/api') ? 'unknown' : 'pages';
}

function observe(durations: Map<string, Durations>, labels: string, value: number): void {
  let one = durations.get(labels);
  if (one === undefined) {
    one = { counts: BUCKETS.map(() => 0), sum: 0, total: 0 };
    durations.set(labels, one);
  }
  const bucket = BUCKETS.findIndex((end) => value <= end);
  if (bucket >= 0) one.counts[bucket] = (one.counts[bucket] ?? 0) + 1;
  one.sum += value;
  one.total += 1;
}

function writeHistogram(labels: string, { counts, sum, total }: Durations): string[] {
  const name = 'leeway_http_request_duration_seconds';
  let below = 0;
  const buckets = BUCKETS.map((end, index) => {
    below += counts[index] ?? 0;
    return `${name}_bucket{${labels},le="${end}"} ${below}`;
  });
  return [
    ...buckets,
    `${name}_bucket{${labels},le="+Inf"} ${total}`,
    `${name}_sum{${labels}} ${sum}`,
    `${name}_count{${labels}} ${total}`,
  ];
}

function writePool({ busy, idle, waiting, limit }: PoolUse, process: string): string[] {
  return [
    ...family('leeway_database_connections', 'gauge', 'Connections of this process to the database.'),
    `leeway_database_connections{state="busy",${process}} ${busy}`,
    `leeway_database_connections{state="idle",${process}} ${idle}`,
    ...family('leeway_database_connections_limit', 'gauge', 'The most connections this process opens.'),
    `leeway_database_connections_limit{${process}} ${limit}`,
    ...family('leeway_database_waiting', 'gauge', 'Queries of this process that wait for a connection.'),
    `leeway_database_waiting{${process}} ${waiting}`,
  ];
}

/** When this process began, and how much memory it holds. */
function writeProcess(process: string): string[] {
  return [
    ...family(
      'leeway_process_start_time_seconds',
      'gauge',
      'When this process started, in seconds since 1970.',
    ),
    `leeway_process_start_time_seconds{${process}} ${(performance.timeOrigin / 1000).toFixed(3)}`,
    ...family('leeway_process_resident_memory_bytes', 'gauge', 'Memory this process holds.'),
    `leeway_process_resident_memory_bytes{${process}} ${globalThis.process.memoryUsage.rss()}`,
  ];
}

const family = (name: string, type: string, help: string): string[] => [
  `# HELP ${name} ${help}`,
  `# TYPE ${name} ${type}`,
];

const seconds = (ns: number): number => (Number.isFinite(ns) ? ns / NS : 0);

const escape = (text: string): string =>
  text.replaceAll('\\', '\\\\').replaceAll('"', '\\"').replaceAll('\n', '\\n');
