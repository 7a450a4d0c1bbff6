import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { testApp, type Agent } from '../support/app.ts';

const folder = mkdtempSync(join(tmpdir(), 'leeway-client-'));
const SCRIPT = 'console.log("bust, waist, hip");'.repeat(50);
let agent: Agent;

beforeAll(async () => {
  mkdirSync(join(folder, 'assets'));
  writeFileSync(join(folder, 'index.html'), '<html><head></head><body><div id="root"></div></body></html>');
  writeFileSync(join(folder, 'assets/main-1a2b.js'), SCRIPT);
  writeFileSync(join(folder, 'assets/main-1a2b.js.gz'), gzipSync(SCRIPT));
  writeFileSync(join(folder, 'secret.txt'), 'beside the assets');
  agent = (await testApp({ client: { folder } })).anonymous();
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the built client', () => {
  it('is sent compressed to whoever takes it, under its own type, to be kept for good', async () => {
    const answer = await agent.get('/assets/main-1a2b.js').set('accept-encoding', 'gzip, br');
    expect(answer.status).toBe(200);
    expect(answer.headers).toMatchObject({
      'content-encoding': 'gzip',
      'content-type': 'text/javascript; charset=utf-8',
      'cache-control': 'public, max-age=31536000, immutable',
      vary: 'accept-encoding',
    });
    expect(answer.text).toBe(SCRIPT);
  });

  it('is sent as it is to whoever does not', async () => {
    const answer = await agent.get('/assets/main-1a2b.js').set('accept-encoding', 'identity');
    expect(answer.headers['content-encoding']).toBeUndefined();
    expect(answer.headers['vary']).toBe('accept-encoding');
    expect(answer.text).toBe(SCRIPT);
  });

  it('answers 404, and no page, for a file of another build', async () => {
    const answer = await agent.get('/assets/main-0000.js').set('accept-encoding', 'gzip');
    expect(answer.status).toBe(404);
    expect(answer.headers['content-encoding']).toBeUndefined();
  });

  it('answers plainly that a file is gone, also where its compressed form was there at the start', async () => {
    writeFileSync(join(folder, 'assets/gone.js.gz'), gzipSync(SCRIPT));
    const late = (await testApp({ client: { folder } })).anonymous();
    rmSync(join(folder, 'assets/gone.js.gz'));
    const answer = await late.get('/assets/gone.js').set('accept-encoding', 'gzip');
    expect(answer.status).toBe(404);
    expect(answer.headers['content-encoding']).toBeUndefined();
    expect(answer.text).toBe('There is no such file.');
  });

  it('does not leave its folder', async () => {
    expect((await agent.get('/assets/..%2fsecret.txt')).status).toBe(404);
    expect((await agent.get('/assets/%2e%2e/%2e%2e/package.json')).status).toBe(404);
  });

  it('gives the one page, never kept and with a fresh nonce, for every address that a browser opens', async () => {
    const read = async () => agent.get('/patterns/anything').set('accept', 'text/html');
    const [first, second] = [await read(), await read()];
    expect(first.status).toBe(200);
    expect(first.headers['cache-control']).toBe('no-store');
    expect(first.text).toContain('<div id="root">');
    const nonce = /nonce="([^"]+)"/.exec(first.text)?.[1];
    expect(first.headers['content-security-policy']).toContain(`'nonce-${String(nonce)}'`);
    expect(first.text).not.toBe(second.text);
  });
});
