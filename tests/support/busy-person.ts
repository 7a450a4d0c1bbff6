import { createHash } from 'node:crypto';
import type { Response } from 'supertest';
import { expect } from 'vitest';
import { z } from 'zod';
import { secondFactorSetupSchema } from '../../shared/account-answers.ts';
import { newTokenSchema } from '../../shared/tokens/tokens.schema.ts';
import { adminAct } from '../../server/admin/admin.table.ts';
import { newId } from '../../server/db/columns.ts';
import { keepMessage } from '../../server/mailbox/mailbox.store.ts';
import { PASSWORD, type SignedIn, type TestApp } from './app.ts';
import { bring, CHART, start, upload } from './imports.ts';
import { measuredPerson } from './measured-person.ts';
import { codeOf } from './totp.ts';
import { unzip } from './unzip.ts';

export const sha256 = (content: string | Buffer) => createHash('sha256').update(content).digest('hex');

/** Somebody, and what would show that something of theirs is left. */
export interface Owner extends SignedIn {
  /** What would show that something of the account is left: every id, the address, and words that only it wrote. */
  names: string[];
  secrets: string[];
}

/** Somebody who has used everything there is. */
export async function busyPerson(test: TestApp, word: string): Promise<Owner> {
  const person = await test.signedIn({ isVerified: true, name: `${word} Owner` });
  const { agent, user } = person;
  const { personId, measurementSetId } = await measuredPerson(agent, undefined, `${word} =SUM(A1)`);
  const pattern = await bring(person, { title: `${word} dress`, maker: '../..' });
  const plan = await agent
    .post('/api/plans')
    .send({ name: `${word} plan`, measurementSetId, revisionId: pattern.latestRevisionId, options: {} })
    .expect(201);
  const draft = await start(person, { details: { title: `${word} draft` } });
  await upload(person, draft.id, 'chart', CHART, 'half done ⅜.csv');
  const token = await agent
    .post('/api/tokens')
    .send({ name: `${word} sheet`, scopes: ['people:read'] })
    .expect(201);
  await agent
    .post('/api/account/teacher-request')
    .send({ sentence: `${word} teaches sewing.` })
    .expect(201);
  await test.anonymous().post('/api/auth/request-password-reset').send({ email: user.email }).expect(200);
  const enabled = await agent.post('/api/auth/two-factor/enable').send({ password: PASSWORD }).expect(200);
  const setUp = secondFactorSetupSchema.parse(enabled.body);
  await agent
    .post('/api/auth/two-factor/verify-totp')
    .send({ code: codeOf(setUp.totpURI) })
    .expect(200);
  const message = { from: 'a', subject: 's', messageId: 'm', text: 't', html: 'h' };
  await keepMessage(test.db, message, [user.email]);
  await test.db.insert(adminAct).values({
    id: newId(),
    at: new Date(),
    actorId: null,
    through: 'command',
    action: 'roleChanged',
    subjectId: user.id,
    detail: { from: 'teacher', to: 'member' },
  });
  const ids = [personId, measurementSetId, pattern.id, pattern.latestRevisionId, idOf(plan.body), draft.id];
  return {
    ...person,
    names: [user.id, user.email, sha256(user.email), word, ...ids],
    secrets: [
      newTokenSchema.parse(token.body).token,
      new URL(setUp.totpURI).searchParams.get('secret')!,
      ...setUp.backupCodes,
    ],
  };
}

const idOf = (body: unknown) => z.object({ id: z.string() }).parse(body).id;

/** The files of somebody's archive by their paths. */
export const archiveOf = async (owner: SignedIn): Promise<Map<string, Buffer>> => {
  const answer = await owner.agent
    .post('/api/account/export')
    .send({})
    .buffer(true)
    .parse(intoBuffer)
    .expect(200);
  expect(answer.headers['content-type']).toBe('application/zip');
  expect(answer.headers['content-disposition']).toMatch(
    /^attachment; filename="?leeway-\d{4}-\d\d-\d\d\.zip"?$/,
  );
  return unzip(answer.body as Buffer);
};

function intoBuffer(answer: Response, done: (error: Error | null, body: unknown) => void): void {
  const chunks: Buffer[] = [];
  const stream = answer as unknown as NodeJS.ReadableStream;
  stream.on('data', (chunk: Buffer) => chunks.push(chunk));
  stream.on('end', () => done(null, Buffer.concat(chunks)));
}
