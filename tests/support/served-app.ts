import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { launch, temporaryFolder, untilReady, type DemoSignIn } from './launcher.ts';
import { startMailFolder } from './mail-folder.ts';

declare module 'vitest' {
  interface ProvidedContext {
    /** The built product, running with its demo, and the folder into which its mail comes. */
    servedApp: { url: string; signIns: DemoSignIn[]; mailFolder: string };
  }
}

export interface ServedApp {
  url: string;
  signIns: DemoSignIn[];
  /** Empty where it is served directly: then its mail stays in its own mailbox. */
  mailFolder: string;
  stop: () => Promise<void>;
}

/**
 * Starts the built product on data of its own, as `npm start` does, with the demo in it. Each browser of a test says an
 * address of its own, so that they do not share one's rate limit: so it stands behind a proxy, and sends its mail out.
 * Served directly it is as on somebody's own machine.
 */
export async function startServedApp({ isDirect = false } = {}): Promise<ServedApp> {
  const folder = temporaryFolder();
  const mailFolder = join(folder.path, 'received-mail');
  const mail = isDirect ? null : await startMailFolder(mailFolder);
  const launched = await untilReady(
    await launch({
      dataFolder: folder.path,
      environment: mail === null ? {} : { TRUST_PROXY: 'loopback', SMTP_URL: mail.url },
    }),
  );
  return {
    url: launched.url,
    signIns: launched.signIns(),
    mailFolder,
    async stop() {
      await launched.stop();
      await mail?.close();
      folder.remove();
    },
  };
}

/** One for all files of the run: each makes accounts of its own. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const { url, signIns, mailFolder, stop } = await startServedApp();
  project.provide('servedApp', { url, signIns, mailFolder });
  return stop;
}
