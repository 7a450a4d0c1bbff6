import { setTimeout as wait } from 'node:timers/promises';
import type { APIRequestContext } from 'playwright-core';
import { z } from 'zod';
import { paths } from '../../src/paths.ts';

export interface DrawnPage {
  name: string;
  path: string;
  /** For whom it is drawn; null for somebody signed out. */
  as: 'member' | 'admin' | null;
}

const one = z.object({ id: z.uuid() });
const plansSchema = z.object({
  items: z.array(
    one.extend({
      personId: z.uuid(),
      measurementSetId: z.uuid(),
      patternId: z.uuid(),
      revisionId: z.uuid(),
    }),
  ),
});

/** A chart with one cell that cannot be read, so that the page shows both what was understood and what was not. */
const CHART = 'Size,Bust (cm),Waist (cm),Hip (cm)\n10,84,64,90\n12,88,six,94\n14,92,72,98\n';

/** Every page in src/paths.ts, about the person and the pattern of the demo member's newest plan. */
export async function everyPage(request: APIRequestContext, baseURL: string): Promise<DrawnPage[]> {
  const api = apiOf(request, baseURL);
  const [plan] = (await api.get('/api/plans', plansSchema)).items;
  if (!plan) throw new Error('The demo has no saved plan.');
  const { personId, measurementSetId, patternId, revisionId } = plan;
  const draftId = await draft(api);
  const query = new URLSearchParams({ set: measurementSetId, revision: revisionId }).toString();

  const open: [string, string][] = [
    ['home', paths.home],
    ['sign-in', paths.signIn],
    ['sign-up', paths.signUp],
    ['forgottenPassword', paths.forgottenPassword],
    ['newPassword', `${paths.newPassword}?token=none`],
    ['confirmAddress', `${paths.confirmAddress}?token=none`],
    ['mailbox', paths.mailbox],
    ['mailboxMessage', paths.mailboxMessage(await mailId(request, baseURL))],
    ['interface', paths.interface],
    ['not-found', '/nothing-here'],
  ];
  const signedIn: [keyof typeof paths, string][] = [
    ['account', paths.account],
    ['people', paths.people],
    ['newPerson', paths.newPerson],
    ['person', paths.person(personId)],
    ['editPerson', paths.editPerson(personId)],
    ['measure', paths.measure(personId)],
    ['measurementSet', paths.measurementSet(personId, measurementSetId)],
    ['patterns', paths.patterns],
    ['pattern', paths.pattern(patternId)],
    ['newPattern', paths.newPattern],
    ['editPattern', paths.editPattern(patternId)],
    ['editTable', paths.editTable(patternId)],
    ['compareRevisions', paths.compareRevisions(patternId)],
    ['revision', paths.revision(patternId, revisionId)],
    ['newImport', paths.newImport],
    ['import', paths.import(draftId)],
    ['fit', `${paths.fit}?${query}`],
    ['plans', paths.plans],
    ['plan', paths.plan(plan.id)],
  ];
  const admin: (keyof typeof paths)[] = ['adminPeople', 'adminRequests', 'adminMail', 'adminLog'];
  admin.push('adminHealth', 'adminReference');
  return [
    ...open.map(([name, path]) => ({ name: kebab(name), path, as: null })),
    ...signedIn.map(([name, path]) => ({ name: kebab(name), path, as: 'member' as const })),
    ...admin.map((name) => ({ name: kebab(name), path: String(paths[name]), as: 'admin' as const })),
  ];
}

/** The names of the addresses that `everyPage` must cover. */
export const pageNames = (): string[] => Object.keys(paths).map(kebab);

const kebab = (name: string) => name.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);

type Api = ReturnType<typeof apiOf>;

async function draft(api: Api): Promise<string> {
  const { id } = await api.post('/api/imports', { details: { title: 'Linen tunic' } }, one);
  const file = { name: 'tunic.csv', mimeType: 'text/csv', buffer: Buffer.from(CHART) };
  await api.upload(`/api/imports/${id}/tables/chart`, { file });
  return id;
}

const WAIT_MS = 10_000;

/** A mail in the mailbox, sent for the purpose; where there is no mailbox, an id that leads to nothing. */
async function mailId(request: APIRequestContext, baseURL: string): Promise<string> {
  const until = Date.now() + WAIT_MS;
  const list = () => request.get(`${baseURL}/api/mailbox`);
  if (!(await list()).ok()) return '0190a000-0000-7000-8000-000000000001';
  const email = z
    .object({ email: z.string() })
    .parse(await (await request.get(`${baseURL}/api/account`)).json()).email;
  const headers = { origin: baseURL };
  await request.post(`${baseURL}/api/auth/request-password-reset`, { headers, data: { email } });
  for (;;) {
    const { items } = z.object({ items: z.array(one) }).parse(await (await list()).json());
    if (items[0]) return items[0].id;
    if (Date.now() > until) throw new Error('No mail came into the mailbox.');
    await wait(100);
  }
}

function apiOf(request: APIRequestContext, baseURL: string) {
  const headers = { origin: baseURL };
  const read = async <T extends z.ZodType>(
    response: Awaited<ReturnType<typeof request.get>>,
    schema: T,
  ): Promise<z.output<T>> => {
    if (!response.ok()) throw new Error(`${response.url()}: ${await response.text()}`);
    return schema.parse(await response.json());
  };
  type Multipart = NonNullable<Parameters<typeof request.put>[1]>['multipart'];
  return {
    get: async <T extends z.ZodType>(path: string, schema: T) =>
      read(await request.get(baseURL + path), schema),
    post: async <T extends z.ZodType>(path: string, data: unknown, schema: T) =>
      read(await request.post(baseURL + path, { headers, data }), schema),
    upload: async (path: string, multipart: NonNullable<Multipart>) =>
      read(await request.put(baseURL + path, { headers, multipart }), one),
  };
}
