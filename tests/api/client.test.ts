import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { testApp, type TestApp } from '../support/app.ts';

const folder = mkdtempSync(join(tmpdir(), 'leeway-client-'));
mkdirSync(join(folder, 'assets'));
writeFileSync(
  join(folder, 'index.html'),
  '<!doctype html><html><head><title>Leeway</title></head><body></body></html>',
);
writeFileSync(join(folder, 'assets/main-4f2a.js'), 'export {};');
writeFileSync(join(folder, 'icon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
afterAll(() => rmSync(folder, { recursive: true }));

let test: TestApp;
beforeAll(async () => {
  test = await testApp({ client: { folder } });
});

describe('the browser code', () => {
  it('is the one page at every address that a browser opens', async () => {
    for (const path of ['/', '/people', '/people/new', '/fit?set=a.b']) {
      const answer = await test.anonymous().get(path).set('Accept', 'text/html').expect(200);
      expect(answer.text).toContain('<title>Leeway</title>');
      expect(answer.headers['cache-control']).toBe('no-store');
    }
  });

  it('carries the nonce that its headers allow, another each time', async () => {
    const nonces = [];
    for (let time = 0; time < 2; time += 1) {
      const { text, headers } = await test.anonymous().get('/').set('Accept', 'text/html');
      const nonce = /<meta property="csp-nonce" nonce="([\w-]{20,})">/.exec(text)?.[1];
      expect(headers['content-security-policy']).toContain(`'nonce-${String(nonce)}'`);
      nonces.push(nonce);
    }
    expect(nonces[0]).not.toBe(nonces[1]);
  });

  it('is kept for a year where its name changes with it, and asked for again elsewhere', async () => {
    const script = await test.anonymous().get('/assets/main-4f2a.js').expect(200);
    expect(script.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect(script.headers['content-type']).toMatch(/javascript/);
    const icon = await test.anonymous().get('/icon.svg').expect(200);
    expect(icon.headers['cache-control']).toBe('public, max-age=3600');
  });

  it('answers 404, not the page, to a file that is not there and to the interface', async () => {
    for (const path of ['/assets/gone-1.js', '/gone.png', '/api/gone', '/assets/../../package.json']) {
      const answer = await test.anonymous().get(path).set('Accept', 'text/html,*/*');
      expect([path, answer.status]).toEqual([path, 404]);
      expect(answer.text).not.toContain('<title>');
    }
  });

  it('gives out nothing that lies outside its folder', async () => {
    for (const path of ['/..%2f..%2fetc%2fpasswd', '/%2e%2e/%2e%2e/etc/passwd', '/.env']) {
      const answer = await test.anonymous().get(path).set('Accept', 'text/html');
      expect(answer.text).not.toContain('root:');
    }
  });
});
