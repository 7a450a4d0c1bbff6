import { renameSync } from 'node:fs';
import { join } from 'node:path';
import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import { account as accountTable } from '../../server/account/account.table.ts';
import { newId } from '../../server/db/columns.ts';
import { inTransaction } from '../../server/db/transaction.ts';
import { storedFile } from '../../server/patterns/files.table.ts';
import { measurementSet, person } from '../../server/people/people.table.ts';
import { savedPlan } from '../../server/plans/plans.table.ts';
import { testApp, type SignedIn, type TestApp } from '../support/app.ts';
import { archiveOf, busyPerson, sha256 } from '../support/busy-person.ts';
import { tablesNaming } from '../support/every-table.ts';
import { bring, expectNothingLost } from '../support/imports.ts';
import { measuredPerson } from '../support/measured-person.ts';

let test: TestApp;
beforeAll(async () => {
  test = await testApp({ limits: true });
});

const json = (files: Map<string, Buffer>, path: string) => JSON.parse(files.get(path)!.toString('utf8'));

/** Where each table that names an account goes in its archive; a new table that is not named here fails. */
const IN_ARCHIVE: Record<string, string> = {
  user: 'account.json',
  session: 'account.json',
  access_token: 'account.json',
  teacher_request: 'account.json',
  outbox: 'account.json',
  person: 'people.json',
  measurement_set: 'measurement-sets.json',
  pattern: 'patterns.json',
  pattern_revision: 'patterns.json',
  saved_plan: 'plans.json',
  import_draft: 'drafts.json',
  stored_file: 'files.json',
};
const NOT_IN_ARCHIVE: Record<string, string> = {
  account: 'the password, of which only a hash is kept',
  two_factor: 'the second factor’s key and codes: secrets',
  verification: 'links that are out: secrets',
  spent_token: 'hashes of links that were used',
  admin_act: 'what administrators did; the instance’s own log',
  rate_limit: 'counts of attempts, forgotten within a day',
  mailbox_message: 'the local mailbox, shown on a page of its own',
};

describe('the archive', () => {
  it('holds everything from every table that names the account, and no secret', async () => {
    const ada = await busyPerson(test, 'Adalbert');
    const naming = Object.keys(await tablesNaming(test.db, ada.names)).sort();
    expect(naming).toEqual([...Object.keys(IN_ARCHIVE), ...Object.keys(NOT_IN_ARCHIVE)].sort());
    const files = await archiveOf(ada);
    for (const path of Object.values(IN_ARCHIVE)) expect(files.has(path), path).toBe(true);
    const account = json(files, 'account.json');
    expect(account.account).toMatchObject({ email: ada.user.email, twoFactorEnabled: true });
    expect(account.sessions).toHaveLength(1);
    expect(account.tokens).toMatchObject([{ name: 'Adalbert sheet', scopes: ['people:read'] }]);
    expect(account.teacherRequest.sentence).toBe('Adalbert teaches sewing.');
    expect(account.mail.length).toBeGreaterThan(0);
    expect(json(files, 'people.json')).toMatchObject([{ name: 'Adalbert =SUM(A1)' }]);
    expect(json(files, 'measurement-sets.json')[0].values.hip).toEqual({
      typed: '1060',
      unit: 'mm',
      mm: 1060,
    });
    expect(json(files, 'plans.json')[0].result.status).toBeTypeOf('string');
    expect(json(files, 'drafts.json')).toHaveLength(1);
    const whole = [...files.values()].map((content) => content.toString('latin1')).join('\n');
    const hashes = await test.db.select({ password: accountTable.password }).from(accountTable);
    const secrets = [...ada.secrets, ...hashes.map(({ password }) => password!), test.config.secret];
    for (const secret of secrets) expect(whole).not.toContain(secret);
  });

  it('holds the uploaded files byte for byte, and tables that can be imported again to the same numbers', async () => {
    const bea = await busyPerson(test, 'Beatrix');
    const files = await archiveOf(bea);
    const list = json(files, 'files.json') as { path: string; sha256: string; bytes: number; name: string }[];
    expect(list).toHaveLength(3);
    for (const { path, sha256: hash, bytes } of list) {
      const content = files.get(path)!;
      expect(content).toHaveLength(bytes);
      expect(sha256(content)).toBe(hash);
    }
    const [pattern] = json(files, 'patterns.json');
    const chart = files.get('patterns/001 Beatrix dress/revision 1, size chart.csv')!;
    const finished = files.get('patterns/001 Beatrix dress/revision 1, finished measurements.csv')!;
    const again = await bring(bea, { title: 'Again' }, chart.toString('utf8'), finished.toString('utf8'));
    const mm = (columns: { point: string; values: unknown }[]) =>
      Object.fromEntries(columns.map(({ point, ...column }) => [point, (column as { mm?: unknown }).mm]));
    expect(again.revision.table.sizes).toEqual(pattern.revisions[0].table.sizes);
    expect(mm(again.revision.table.chart as never)).toEqual(mm(pattern.revisions[0].table.chart));
    expect(mm(again.revision.table.finished as never)).toEqual(mm(pattern.revisions[0].table.finished));
  });

  it('guards in CSV what a spreadsheet would run, and has no path that leads out of it', async () => {
    const cid = await busyPerson(test, 'Cidalia');
    const formula = await measuredPerson(cid.agent, { hip: '1000' }, '=1+1');
    expect(formula.personId).toBeTypeOf('string');
    const files = await archiveOf(cid);
    expect(files.get('people.csv')!.toString('utf8')).toMatch(/^﻿name,.*\r\n'=1\+1,adult,bust,mm,/);
    for (const path of files.keys()) expect(path).not.toMatch(/\.\.|^\/|\\|:/);
  });

  it('holds nothing of anybody else', async () => {
    const eve = await busyPerson(test, 'Evangeline');
    const fay = await busyPerson(test, 'Fayette');
    const files = await archiveOf(fay);
    const whole = [...files.values()].map((content) => content.toString('utf8')).join('\n');
    expect(whole).toContain('Fayette dress');
    for (const name of eve.names) expect(whole).not.toContain(name);
  });

  it('shows one moment while data changes: every file named is there, every plan has its set and its revision', async () => {
    const gil = await busyPerson(test, 'Gilberta');
    const run = { isOver: false };
    const changing = [changeFiles(gil, run), changeRows(gil, run), changeRows(gil, run)];
    for (let round = 0; round < 8; round += 1) {
      const files = await archiveOf(gil);
      const list = json(files, 'files.json') as { id: string; path: string; sha256: string }[];
      for (const { path, sha256: hash } of list) {
        expect(sha256(files.get(path)!)).toBe(hash);
      }
      const ids = (path: string) => (json(files, path) as { id: string }[]).map(({ id }) => id);
      const patterns = json(files, 'patterns.json') as {
        latestRevisionId: string;
        revisions: { id: string; chartFileId: string; finishedFileId: string }[];
      }[];
      const revisions = patterns.flatMap((pattern) => pattern.revisions);
      const kept = new Set(list.map(({ id }) => id));
      for (const pattern of patterns) {
        expect(pattern.revisions.map(({ id }) => id)).toContain(pattern.latestRevisionId);
      }
      for (const { chartFileId, finishedFileId } of revisions) {
        expect([kept.has(chartFileId), kept.has(finishedFileId)]).toEqual([true, true]);
      }
      for (const plan of json(files, 'plans.json') as { measurementSetId: string; revisionId: string }[]) {
        expect(ids('measurement-sets.json')).toContain(plan.measurementSetId);
        expect(revisions.map(({ id }) => id)).toContain(plan.revisionId);
      }
      const people = new Set(ids('people.json'));
      for (const set of json(files, 'measurement-sets.json') as { personId: string }[]) {
        expect(people.has(set.personId)).toBe(true);
      }
    }
    run.isOver = true;
    await Promise.all(changing);
    await expectNothingLost(test);
  }, 120_000);

  it('is given to its owner only, on our own pages’ request', async () => {
    const { agent } = await test.signedIn();
    await test.anonymous().post('/api/account/export').send({}).expect(401);
    await agent.post('/api/account/export').set('Origin', 'https://elsewhere.example').send({}).expect(403);
    await agent.get('/api/account/export').expect(404);
  });

  it('fails as a whole where a file’s bytes are missing, and leaves no transaction open', async () => {
    const lea = await busyPerson(test, 'Leandra');
    const [file] = await test.db.select().from(storedFile).where(eq(storedFile.ownerId, lea.user.id));
    const path = join(test.config.filesFolder, file!.id.slice(-2), file!.id);
    renameSync(path, `${path}.away`);
    await lea.agent.post('/api/account/export').send({}).expect(500);
    expect(test.takeErrors()).toHaveLength(1);
    renameSync(`${path}.away`, path);
    expect((await archiveOf(lea)).size).toBeGreaterThan(10);
  });
});

/** Brings patterns and deletes them through the interface, as a person does. */
async function changeFiles(by: SignedIn, run: { isOver: boolean }): Promise<void> {
  for (let at = 0; !run.isOver; at += 1) {
    const pattern = await bring(by, { title: `Change ${String(at)}` });
    await by.agent.delete(`/api/patterns/${pattern.id}`).expect(204);
  }
}

/** A person, a set and a plan come in one transaction and go in another, as fast as the database takes it. */
async function changeRows(by: SignedIn, run: { isOver: boolean }): Promise<void> {
  const [one] = await test.db.select().from(person).where(eq(person.ownerId, by.user.id));
  const [set] = await test.db.select().from(measurementSet).where(eq(measurementSet.personId, one!.id));
  const [plan] = await test.db.select().from(savedPlan).where(eq(savedPlan.ownerId, by.user.id));
  while (!run.isOver) {
    const ids = { person: newId(), set: newId(), plan: newId() };
    await inTransaction(test.db, async (tx) => {
      await tx.insert(person).values({ ...one!, id: ids.person });
      await tx.insert(measurementSet).values({ ...set!, id: ids.set, personId: ids.person });
      await tx.insert(savedPlan).values({ ...plan!, id: ids.plan, measurementSetId: ids.set });
    });
    await inTransaction(test.db, async (tx) => {
      await tx.delete(savedPlan).where(eq(savedPlan.id, ids.plan));
      await tx.delete(measurementSet).where(eq(measurementSet.id, ids.set));
      await tx.delete(person).where(eq(person.id, ids.person));
    });
  }
}
