import type { ChildProcess, SpawnOptions } from 'node:child_process';

export function spawnTied(
  command: string,
  args: string[],
  options?: SpawnOptions & { as?: { uid: number; gid: number } },
): ChildProcess;
