import type { TestProject } from 'vitest/node';
import { launch, temporaryFolder, untilReady, type DemoSignIn } from './launcher.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** The built product, running with its demo. */
    servedApp: { url: string; signIns: DemoSignIn[] };
  }
}

export interface ServedApp {
  url: string;
  signIns: DemoSignIn[];
  stop: () => Promise<void>;
}

/** Starts the built product on data of its own, as `npm start` does, with the demo in it. */
export async function startServedApp(): Promise<ServedApp> {
  const folder = temporaryFolder();
  const launched = await untilReady(
    await launch({
      dataFolder: folder.path,
      // Each browser of a test says an address of its own, so that they do not share one's rate limit.
      environment: { TRUST_PROXY: 'loopback' },
    }),
  );
  return {
    url: launched.url,
    signIns: launched.signIns(),
    async stop() {
      await launched.stop();
      folder.remove();
    },
  };
}

/** One for all files of the run: each makes accounts of its own. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const { url, signIns, stop } = await startServedApp();
  project.provide('servedApp', { url, signIns });
  return stop;
}
