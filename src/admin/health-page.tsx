import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { AdminHealth } from '../../shared/admin/health.schema.ts';
import { paths } from '../paths.ts';
import { Button } from '../ui/button.tsx';
import { TextLink } from '../ui/link.tsx';
import { printMoment } from '../ui/moment.ts';
import { Notice } from '../ui/notice.tsx';
import { AdminFrame } from './admin-frame.tsx';
import { DiskBar } from './disk-bar.tsx';
import { adminHealthQuery } from './queries.ts';
import { sayBytes, sayDuration } from './say-health.ts';

export const loader = (client: QueryClient) => () => client.query(adminHealthQuery);

export function Component() {
  const { data: health, refetch, isFetching, dataUpdatedAt } = useSuspenseQuery(adminHealthQuery);
  const { version, startedAt, uptimeSeconds, database, disk, mail } = health;
  return (
    <AdminFrame
      title="Health"
      lead={`As it was ${printMoment(new Date(dataUpdatedAt).toISOString())}, told by the process that answered.`}
    >
      <WhatToSee health={health} />
      <dl className="mt-7 max-w-[52rem] border-t border-rule">
        <Fact name="Version">{version}</Fact>
        <Fact name="Running for">
          {sayDuration(uptimeSeconds)}, since {printMoment(startedAt)}
        </Fact>
        <Fact name="Database">
          {database.version}, {database.migrationsApplied} of {database.migrationsKnown} migrations applied
        </Fact>
        <Fact name="Disk">
          <DiskBar {...disk} />
          {sayBytes(disk.freeBytes)} free of {sayBytes(disk.totalBytes)}
        </Fact>
        <Fact name="Mail">
          <TextLink to={paths.adminMail}>{mail.waiting} waiting</TextLink>,{' '}
          <TextLink to={`${paths.adminMail}?state=failed`}>{mail.failed} given up</TextLink>
        </Fact>
        <Fact name="Counters">
          <a
            href="/api/metrics"
            className="text-woad underline decoration-1 underline-offset-4 hover:decoration-2"
          >
            Requests, connections and the event loop
          </a>{' '}
          as plain text, for whatever watches over the machine
        </Fact>
      </dl>
      <p className="mt-6">
        <Button pending={isFetching} onClick={() => void refetch()}>
          {isFetching ? 'Looking' : 'Look again'}
        </Button>
      </p>
    </AdminFrame>
  );
}

const LITTLE_ROOM = 0.1;

/** What asks for somebody's attention; where nothing does, that. */
function WhatToSee({ health: { database, disk, mail } }: { health: AdminHealth }) {
  const lines = [
    ...(database.migrationsApplied === database.migrationsKnown
      ? []
      : ['The tables are not those of this version: start it again, so that they are brought up to it.']),
    ...(disk.freeBytes < LITTLE_ROOM * disk.totalBytes ? ['Less than a tenth of the disk is free.'] : []),
    ...(mail.failed > 0 ? ['Some mail was given up: see why, and send it again.'] : []),
  ];
  if (lines.length === 0) return <p className="mt-6 text-lead font-semibold">All is as it should be.</p>;
  return (
    <Notice kind="caution" word="To be looked at" className="mt-6 max-w-[44rem]">
      {lines.map((line) => (
        <p key={line}>{line}</p>
      ))}
    </Notice>
  );
}

function Fact({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="grid gap-x-6 border-b border-rule py-3 sm:grid-cols-[12rem_1fr]">
      <dt className="text-note text-ink-2 sm:pt-0.5">{name}</dt>
      <dd className="min-w-0">{children}</dd>
    </div>
  );
}
