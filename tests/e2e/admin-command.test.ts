import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { command } from '../support/commands.ts';
import { launch, temporaryFolder, untilReady, type Launched } from '../support/launcher.ts';

const folder = temporaryFolder();
afterAll(folder.remove);
const running: Launched[] = [];
afterAll(() => Promise.all(running.map((launched) => launched.stop())));

async function start(): Promise<Launched> {
  const launched = await untilReady(await launch({ dataFolder: folder.path }));
  running.push(launched);
  return launched;
}

/** One of the demo's accounts, by its role at the start. */
async function signIn({ url, signIns }: Launched, role: string) {
  const demo = signIns().find((one) => one.role === role);
  if (demo === undefined) throw new Error(`no demo account with the role ${role}`);
  const headers = { 'content-type': 'application/json', origin: url };
  const signedIn = await fetch(`${url}/api/auth/sign-in/email`, {
    method: 'POST',
    headers,
    body: JSON.stringify({ email: demo.email, password: demo.password }),
  });
  const cookie = signedIn.headers.getSetCookie()[0]?.split(';')[0] ?? '';
  const get = (path: string) => fetch(`${url}${path}`, { headers: { cookie } });
  return { email: demo.email, get };
}

const admin = (...args: string[]) => command('admin', args, { LEEWAY_DATA: folder.path });

describe('npm run admin', () => {
  let launched: Launched;
  beforeAll(async () => {
    launched = await start();
  });

  it('makes an account of the running instance an administrator, at once and in the log, and once only', async () => {
    const member = await signIn(launched, 'member');
    expect((await member.get('/api/admin/people')).status).toBe(403);
    const made = await admin(member.email.toUpperCase());
    expect(made).toEqual({ code: 0, output: `${member.email.toUpperCase()} is an administrator now.\n` });
    expect((await member.get('/api/admin/people')).status).toBe(200);
    const again = await admin(member.email);
    expect(again.code).toBe(0);
    expect(again.output).toContain('already');
    const log = (await (await member.get('/api/admin/log')).json()) as { items: object[]; total: number };
    expect(log.total).toBe(1);
    expect(log.items[0]).toMatchObject({ through: 'command', action: 'administratorMade', by: null });
  });

  it('says in a sentence what is wrong', async () => {
    for (const [args, sentence] of [
      [[], 'Say whose account: npm run admin -- name@example.org'],
      [['nobody'], 'Say whose account'],
      [['a@example.org', 'b@example.org'], 'Say whose account'],
      [
        ['nobody@example.org'],
        'There is no account with the address nobody@example.org: sign up with it first.',
      ],
    ] as const) {
      const { code, output } = await admin(...args);
      expect([args, code]).toEqual([args, 1]);
      expect(output).toContain(sentence);
      expect(output).not.toContain('    at ');
    }
  });

  it('works on a stopped instance, which it leaves stopped', async () => {
    const teacher = await signIn(launched, 'teacher');
    await launched.stop();
    expect((await admin(teacher.email)).output).toContain(`${teacher.email} is an administrator now.`);
    launched = await start();
    expect((await (await signIn(launched, 'teacher')).get('/api/admin/people')).status).toBe(200);
  });

  it('says where it looked when there is no data', async () => {
    const empty = temporaryFolder();
    const { code, output } = await command('admin', ['a@example.org'], { LEEWAY_DATA: empty.path });
    expect(code).toBe(1);
    expect(output).toContain(`There is no data in ${empty.path}`);
    empty.remove();
  });
});
