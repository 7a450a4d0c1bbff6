import { readdirSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createFileStore } from '../../server/files/file-store.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { CHART, NOWHERE, start, upload } from '../support/imports.ts';

let test: TestApp;
let ada: SignedIn;
beforeAll(async () => {
  test = await testApp();
  ada = await test.signedIn();
});

async function keep(content: string | Buffer, name: string) {
  const { id } = await start(ada);
  const { chart } = await upload(ada, id, 'chart', content, name);
  return chart?.file ?? { id: '', name: '', bytes: 0 };
}

describe('files: giving one back', () => {
  it('byte by byte as it came, to be saved and never to be run', async () => {
    const content = Buffer.from([...Buffer.from('Size,Bust (cm)\r\nS,'), 0xbd, ...Buffer.from('90\r\n')]);
    const { id } = await keep(content, 'chart.html');
    const answer = await ada.agent.get(`/api/files/${id}`).buffer(true).expect(200);
    expect(Buffer.from(answer.body as Buffer)).toEqual(content);
    expect(answer.headers).toMatchObject({
      'content-type': 'application/octet-stream',
      'content-disposition': 'attachment; filename=chart.html',
      'x-content-type-options': 'nosniff',
      'cache-control': 'no-store',
    });
  });

  it.each([
    ['../../etc/passwd', 'passwd'],
    ['C:\\Users\\me\\chart.csv', 'chart.csv'],
    ['a\r\nSet-Cookie: x.csv', 'aSet-Cookie x.csv'],
    ['\u202Evsc.exe', 'vsc.exe'],
    ['...', 'table'],
    ['Größe ⅜.csv', 'Größe ⅜.csv'],
    [`${'x'.repeat(400)}.csv`, `${'x'.repeat(196)}.csv`],
  ])('under a harmless name: %s', async (sent, name) => {
    const file = await keep(CHART, sent);
    expect(file.name).toBe(name);
    const { headers } = await ada.agent.get(`/api/files/${file.id}`).expect(200);
    expect(headers['content-disposition']).not.toMatch(/[\r\n]|\.\.\//);
  });
});

describe('files: who may', () => {
  it('nobody without signing in', async () => {
    const { id } = await keep(CHART, 'a.csv');
    await test.anonymous().get(`/api/files/${id}`).expect(401);
  });

  it.each(['member', 'teacher', 'admin'] as const)('not another %s', async (role) => {
    const { id } = await keep(CHART, 'a.csv');
    const { agent } = await test.signedIn({ role });
    await agent.get(`/api/files/${id}`).expect(404);
  });

  it('answers 404 to what is not there or is no id', async () => {
    await ada.agent.get(`/api/files/${NOWHERE}`).expect(404);
    await ada.agent.get('/api/files/..%2f..%2fsecret').expect(404);
  });
});

describe('the file store', () => {
  let root = '';
  beforeAll(async () => {
    root = await mkdtemp(join(tmpdir(), 'leeway-files-'));
  });
  afterAll(() => rm(root, { recursive: true, force: true }));

  it('keeps bytes whole, gives them back, removes them, and leaves nothing beside', async () => {
    const files = createFileStore(root);
    const bytes = Buffer.from([0, 1, 2, 255]);
    await files.put(NOWHERE, bytes);
    expect(await files.get(NOWHERE)).toEqual(bytes);
    await files.put(NOWHERE, Buffer.from('other'));
    expect((await files.get(NOWHERE)).toString()).toBe('other');
    expect(names()).toEqual([NOWHERE]);
    await files.remove(NOWHERE);
    await files.remove(NOWHERE);
    await expect(files.get(NOWHERE)).rejects.toThrow();
    expect(names()).toEqual([]);
  });

  it.each(['../x', '/etc/passwd', '', NOWHERE.toUpperCase(), `${NOWHERE}/..`, `${NOWHERE}\n`])(
    'takes no text for an id that could lead elsewhere: “%s”',
    async (id) => {
      const files = createFileStore(root);
      await expect(files.put(id, Buffer.from('x'))).rejects.toThrow(RangeError);
      expect(() => files.get(id)).toThrow(RangeError);
      expect(() => files.remove(id)).toThrow(RangeError);
    },
  );

  it('leaves no half-written file where writing fails', async () => {
    const files = createFileStore(join(root, 'store'));
    const broken = {
      get length(): number {
        throw new Error('gone');
      },
    } as unknown as Uint8Array;
    await expect(files.put(NOWHERE, broken)).rejects.toThrow();
    expect(names().filter((name) => name.includes('part'))).toEqual([]);
  });

  const names = () =>
    readdirSync(root, { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => entry.name);
});
