import { existsSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startDatabase } from '../../server/bin/database.mjs';
import { createDatabase } from '../../server/db/client.ts';
import { migrate } from '../../server/db/migrate.ts';
import { createFileStore } from '../../server/files/file-store.ts';
import { command, everything } from '../support/commands.ts';
import { freshDatabase } from '../support/database.ts';
import { launch, temporaryFolder, untilReady, type Launched } from '../support/launcher.ts';

const here = temporaryFolder();
const archives = temporaryFolder();
const archive = (name: string) => join(archives.path, `${name}.tgz`);
const folders = [here, archives];
const emptyFolder = () => {
  const folder = temporaryFolder();
  folders.push(folder);
  return folder.path;
};
afterAll(() => folders.forEach((folder) => folder.remove()));

const running: Launched[] = [];
afterAll(() => Promise.all(running.map((launched) => launched.stop())));
async function start(dataFolder: string): Promise<Launched> {
  const launched = await untilReady(await launch({ dataFolder }));
  running.push(launched);
  return launched;
}

/** Somebody of the demo, signed in. */
async function signIn({ url, signIns }: Launched) {
  const headers = { 'content-type': 'application/json', origin: url };
  const [demo] = signIns();
  const signedIn = await fetch(`${url}/api/auth/sign-in/email`, {
    method: 'POST',
    headers,
    body: JSON.stringify({ email: demo?.email, password: demo?.password }),
  });
  expect(signedIn.status).toBe(200);
  const cookie = signedIn.headers.getSetCookie()[0]?.split(';')[0] ?? '';
  return asker(url, cookie);
}

function asker(url: string, cookie: string) {
  const ask = async (method: string, path: string, body?: object | FormData) =>
    fetch(`${url}${path}`, {
      method,
      headers: {
        origin: url,
        cookie,
        ...(body === undefined || body instanceof FormData ? {} : { 'content-type': 'application/json' }),
      },
      ...(body === undefined ? {} : { body: body instanceof FormData ? body : JSON.stringify(body) }),
    });
  const made = async (method: string, path: string, body?: object | FormData) => {
    const response = await ask(method, path, body);
    if (!response.ok) throw new Error(`${path}: ${await response.text()}`);
    return (await response.json()) as Record<string, string>;
  };
  return { ask, made, cookie };
}
type Asker = ReturnType<typeof asker>;

/** Everything that a careless dump would lose: ends of line, quotes, wide signs, sixteenths of an inch. */
const ODD = 'Ilse\u2028"O\'Hara" \\ %_ `x`; 林 👩🏽‍🦱\tend';
const CHART = 'Size,Bust (in),Waist (in)\n12,34 1/16,26 1/2\n14,36 3/16,28\n';

async function addOddThings(by: Asker): Promise<void> {
  const notes = 'first line\nsecond line; -- \u0001\r\nthird';
  const person = await by.made('POST', '/api/people', {
    ...{ name: ODD, stage: 'adult', chestWord: 'bust', unit: 'in', notes },
  });
  await by.made('POST', `/api/people/${String(person['id'])}/measurement-sets`, {
    ...{ takenOn: '2025-01-31', takenBy: 'self', unit: 'in', typed: { bust: '36 1/16', hip: '40 3/16' } },
  });
  await draft(by);
}

async function draft(by: Asker): Promise<string> {
  const { id } = await by.made('POST', '/api/imports', {});
  const form = new FormData();
  form.set('file', new Blob([CHART]), 'zoë’s chart.csv');
  await by.made('PUT', `/api/imports/${String(id)}/tables/chart`, form);
  return String(id);
}

/** The data of a stopped instance. */
async function readStopped(folder: string) {
  const server = await startDatabase(folder);
  try {
    return await everything(server.url);
  } finally {
    await server.stop();
  }
}

const filesIn = (folder: string): Record<string, string> =>
  Object.fromEntries(
    readdirSync(join(folder, 'files'), { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => [entry.name, readFileSync(join(entry.parentPath, entry.name)).toString('base64')]),
  );

const idsOf = (tables: Awaited<ReturnType<typeof everything>>, table: string) =>
  (tables[table]?.rows ?? []).map((row) => (JSON.parse(row) as string[])[0] ?? '');

let cookie: string;

describe('backing up and restoring', () => {
  let launched: Launched;
  let restored: string;
  beforeAll(async () => {
    launched = await start(here.path);
    const member = await signIn(launched);
    cookie = member.cookie;
    await addOddThings(member);
  });

  it('gives the running instance back row by row and file by file, in an empty folder', async () => {
    const made = await command('backup', [archive('running')], { LEEWAY_DATA: here.path });
    expect(made).toMatchObject({ code: 0 });
    expect(made.output).toContain(`files to ${archive('running')}`);
    expect(statSync(archive('running')).mode & 0o777).toBe(0o600);
    await launched.stop();
    restored = emptyFolder();
    const back = await command('restore', [archive('running'), '--into', restored], {});
    expect(back).toMatchObject({ code: 0 });
    expect(back.output).toContain(`LEEWAY_DATA=${restored} npm start`);
    const before = await readStopped(here.path);
    const after = await readStopped(restored);
    expect(Object.keys(before).length).toBeGreaterThan(12);
    expect(before['person']?.rows.some((row) => row.includes("O'Hara"))).toBe(true);
    expect(after).toEqual(before);
    expect(Object.keys(filesIn(here.path)).length).toBeGreaterThan(0);
    expect(filesIn(restored)).toEqual(filesIn(here.path));
    for (const name of ['secret', 'demo-sign-ins.json']) {
      expect(readFileSync(join(restored, name), 'utf8')).toBe(readFileSync(join(here.path, name), 'utf8'));
      expect(statSync(join(restored, name)).mode & 0o777).toBe(0o600);
    }
    expect(readdirSync(restored).filter((name) => name.endsWith('.part'))).toEqual([]);
    expect(readdirSync(here.path).filter((name) => name.endsWith('.part'))).toEqual([]);
  });

  it('starts from what was restored: the session from before goes on, and the people are there', async () => {
    const again = await start(restored);
    const by = asker(again.url, cookie);
    const me = await by.made('GET', '/api/me');
    expect(me['user']).toMatchObject({ role: 'member' });
    const people = await by.made('GET', `/api/people?q=${encodeURIComponent('Ilse')}`);
    expect(people['items']).toMatchObject([{ name: ODD }]);
    await again.stop();
  });

  it('gives a stopped instance back as well, which it leaves stopped', async () => {
    const made = await command('backup', [archive('stopped')], { LEEWAY_DATA: here.path });
    expect(made).toMatchObject({ code: 0 });
    expect(existsSync(join(here.path, 'database.cnf'))).toBe(false);
    const into = emptyFolder();
    expect(await command('restore', [archive('stopped')], { LEEWAY_DATA: into })).toMatchObject({ code: 0 });
    expect(await readStopped(into)).toEqual(await readStopped(here.path));
    expect(filesIn(into)).toEqual(filesIn(here.path));
  });

  it('takes one moment of an instance that is being written to: every row’s file is there, and no other', async () => {
    const busy = await start(here.path);
    const by = await signIn(busy);
    let isOver = false as boolean;
    const writing = (async () => {
      let drafts = 0;
      for (; !isOver; drafts += 1) {
        const id = await draft(by);
        if (drafts % 2 === 0) expect((await by.ask('DELETE', `/api/imports/${id}`)).status).toBe(204);
      }
      return drafts;
    })();
    const made = await command('backup', [archive('busy')], { LEEWAY_DATA: here.path });
    isOver = true;
    expect(await writing).toBeGreaterThan(1);
    expect(made).toMatchObject({ code: 0 });
    expect(made.output).not.toContain('were not in the data folder');
    await busy.stop();
    const into = emptyFolder();
    expect(await command('restore', [archive('busy'), '--into', into], {})).toMatchObject({ code: 0 });
    const tables = await readStopped(into);
    expect(Object.keys(filesIn(into)).sort()).toEqual(idsOf(tables, 'stored_file').sort());
    // A draft and the file it refers to were written in one transaction.
    const files = new Set(idsOf(tables, 'stored_file'));
    for (const row of tables['import_draft']?.rows ?? []) {
      const named = (JSON.parse(row) as (string | null)[])[4];
      if (named != null) expect(files.has(named)).toBe(true);
    }
  });
});

describe('what is refused, in a sentence', () => {
  it('a folder that holds anything', async () => {
    const into = emptyFolder();
    writeFileSync(join(into, 'mine.txt'), 'mine');
    const { code, output } = await command('restore', [archive('stopped'), '--into', into], {});
    expect(code).toBe(1);
    expect(output).toContain('is not empty');
    expect(output).not.toContain('    at ');
    expect(readdirSync(into)).toEqual(['mine.txt']);
  });

  it('an archive that was cut short, changed, or never was one; the folder stays empty', async () => {
    const whole = readFileSync(archive('stopped'));
    writeFileSync(archive('short'), whole.subarray(0, whole.length / 2));
    const flipped = Buffer.from(whole);
    flipped[Math.floor(whole.length / 2)] = (flipped[Math.floor(whole.length / 2)] ?? 0) ^ 0xff;
    writeFileSync(archive('changed'), flipped);
    writeFileSync(archive('other'), 'not an archive');
    for (const name of ['short', 'changed', 'other']) {
      const into = emptyFolder();
      const { code, output } = await command('restore', [archive(name), '--into', into], {});
      expect([name, code]).toEqual([name, 1]);
      expect(output).toContain('is no whole backup of Leeway');
      expect(readdirSync(into)).toEqual([]);
    }
  });

  it('no file, no such file, one file too many', async () => {
    const into = emptyFolder();
    for (const [args, sentence] of [
      [[], 'Say which file'],
      [[archive('stopped'), '--into'], 'Say which file'],
      [[archive('stopped'), archive('busy'), '--into', into], 'Say which file'],
      [[archive('nothing'), '--into', into], 'There is no file'],
    ] as const) {
      const { code, output } = await command('restore', [...args], { LEEWAY_DATA: into });
      expect([args, code]).toEqual([args, 1]);
      expect(output).toContain(sentence);
    }
    expect(readdirSync(into)).toEqual([]);
  });

  it('a backup over a file, into no folder, or of nothing', async () => {
    const before = readFileSync(archive('stopped'));
    for (const [file, data, sentence] of [
      [archive('stopped'), here.path, 'is there already'],
      [join(archives.path, 'no/such/folder.tgz'), here.path, 'There is no folder'],
      [archive('of-nothing'), emptyFolder(), 'There is no data in'],
    ] as const) {
      const { code, output } = await command('backup', [file], { LEEWAY_DATA: data });
      expect([file, code]).toEqual([file, 1]);
      expect(output).toContain(sentence);
    }
    expect(readFileSync(archive('stopped')).equals(before)).toBe(true);
    expect(existsSync(archive('of-nothing'))).toBe(false);
  });
});

describe('with a database of one’s own', () => {
  it('backs up what DATABASE_URL names and restores it into an empty one, and into no other', async () => {
    const from = await freshDatabase('leeway_backed_up');
    const database = createDatabase(from, { connections: 1 });
    await migrate(database);
    const id = '0190d5f2-0000-7000-8000-00000000abcd';
    const user = '0190d5f2-0000-7000-8000-000000000001';
    await database.db.execute(sql`INSERT INTO user (id, name, email, created_at, updated_at)
      VALUES (${user}, ${ODD}, 'ada@example.org', '2025-01-31 10:00:00.123', '2025-01-31 10:00:00.123')`);
    await database.db
      .execute(sql`INSERT INTO stored_file (id, owner_id, name, bytes, sha256, media_type, created_at)
      VALUES (${id}, ${user}, ${ODD}, 3, ${'0'.repeat(64)}, 'text/csv', '2025-01-31 10:00:00.123')`);
    await database.close();
    const data = emptyFolder();
    await createFileStore(join(data, 'files')).put(id, Buffer.from([0, 10, 255]));
    const made = await command('backup', [archive('own')], { LEEWAY_DATA: data, DATABASE_URL: from });
    expect(made).toMatchObject({ code: 0 });
    expect(made.output).toContain('1 files');
    const to = await freshDatabase('leeway_restored');
    const into = emptyFolder();
    const environment = { LEEWAY_DATA: into, DATABASE_URL: to };
    expect(await command('restore', [archive('own')], environment)).toMatchObject({ code: 0 });
    expect(await everything(to)).toEqual(await everything(from));
    expect(filesIn(into)).toEqual({ [id]: Buffer.from([0, 10, 255]).toString('base64') });
    expect(existsSync(join(into, 'database'))).toBe(false);
    rmSync(into, { recursive: true });
    const again = await command('restore', [archive('own')], environment);
    expect(again.code).toBe(1);
    expect(again.output).toContain('has tables already');
    expect(await everything(to)).toEqual(await everything(from));
  });
});
