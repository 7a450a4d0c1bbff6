import { launch, temporaryFolder, untilReady } from '../support/launcher.ts';
import type { Figure } from './figure.ts';

const STARTS = 5;

/** From `npm start` to the printed address, where everything is installed, built and seeded. */
export async function run(): Promise<Figure[]> {
  const folder = temporaryFolder();
  const startOnce = async () => {
    const began = performance.now();
    const launched = await untilReady(await launch({ dataFolder: folder.path, isThroughNpm: true }));
    const took = performance.now() - began;
    await launched.stop();
    return took;
  };
  try {
    await startOnce();
    const times: number[] = [];
    for (let index = 0; index < STARTS; index += 1) times.push(await startOnce());
    const median = times.sort((a, b) => a - b)[Math.floor(STARTS / 2)] ?? 0;
    return [
      {
        name: 'second start',
        value: Math.round(median),
        unit: 'ms',
        ratio: Math.round((median / 1000) * 100) / 100,
        reference: 'one second',
      },
    ];
  } finally {
    folder.remove();
  }
}
