import { gzipSync } from 'node:zlib';
import { build } from 'esbuild';
import { launchBrowser, newVisit } from '../support/browser.ts';
import { ROOT } from '../support/launcher.ts';
import { startServedApp } from '../support/served-app.ts';
import type { Figure } from './figure.ts';

const kilobytes = (bytes: number) => Math.round(bytes / 100) / 10;

/** All JavaScript that the front page loads in the real browser, signed out, until it is at rest. */
export async function run(): Promise<Figure[]> {
  const app = await startServedApp();
  const browser = await launchBrowser();
  try {
    const page = await (await newVisit(browser, app.url)).newPage();
    const bodies: Promise<Buffer>[] = [];
    page.on('response', (response) => {
      if (/javascript/.test(response.headers()['content-type'] ?? '')) bodies.push(response.body());
    });
    await page.goto('/', { waitUntil: 'networkidle' });
    const bytes = (await Promise.all(bodies)).reduce(
      (sum, body) => sum + gzipSync(body, { level: 9 }).length,
      0,
    );
    const alone = await reactAlone();
    return [
      {
        name: 'front page, JavaScript gzipped (budget 170)',
        value: kilobytes(bytes),
        unit: 'kB',
        ratio: Math.round((bytes / alone) * 100) / 100,
        reference: `react and react-dom alone: ${String(kilobytes(alone))} kB`,
      },
    ];
  } finally {
    await browser.close();
    await app.stop();
  }
}

async function reactAlone(): Promise<number> {
  const { outputFiles } = await build({
    stdin: {
      contents:
        "import { createRoot } from 'react-dom/client'; import { createElement } from 'react'; createRoot(document.body).render(createElement('p'));",
      resolveDir: ROOT,
    },
    bundle: true,
    minify: true,
    write: false,
    format: 'esm',
    define: { 'process.env.NODE_ENV': '"production"' },
  });
  return outputFiles.reduce((sum, file) => sum + gzipSync(file.contents, { level: 9 }).length, 0);
}
