import { launch, temporaryFolder, untilReady } from '../support/launcher.ts';
import type { Figure } from './figure.ts';

const STARTS = 3;

/** From `npm run dev` to a front page that answers on its one port, where everything is installed and seeded. */
export async function run(): Promise<Figure[]> {
  const folder = temporaryFolder();
  const startOnce = async () => {
    const began = performance.now();
    const launched = await untilReady(
      await launch({ dataFolder: folder.path, isThroughNpm: true, isDevelopment: true }),
    );
    const page = await (await fetch(launched.url)).text();
    const took = performance.now() - began;
    await launched.stop();
    // The page that is being written, not the built one: it brings what reloads it.
    if (!page.includes('/@vite/client')) throw new Error('This is not the page with hot reload.');
    return took;
  };
  try {
    await startOnce();
    const times: number[] = [];
    for (let index = 0; index < STARTS; index += 1) times.push(await startOnce());
    const median = times.sort((a, b) => a - b)[Math.floor(STARTS / 2)] ?? 0;
    return [
      {
        name: 'second start in development (goal 3000)',
        value: Math.round(median),
        unit: 'ms',
        ratio: Math.round((median / 3000) * 100) / 100,
        reference: 'three seconds',
      },
    ];
  } finally {
    folder.remove();
  }
}
