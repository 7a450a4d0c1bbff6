import { sql } from 'drizzle-orm';
import supertest from 'supertest';
import { beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { describedNouns } from '../../server/described-routes.ts';
import { describeInterface, type Operation } from '../../server/openapi/document.ts';
import { newTokenSchema, TOKEN_SCOPES, type TokenScope } from '../../shared/tokens/tokens.schema.ts';
import { testApp, type Agent, type SignedIn, type TestApp } from '../support/app.ts';
import { unlikeDescription } from '../support/described-answer.ts';
import { accountRows } from '../support/rights/account.ts';
import { adminRows } from '../support/rights/admin.ts';
import { editRows } from '../support/rights/edits.ts';
import { instanceRows } from '../support/rights/instance.ts';
import { MARKER } from '../support/rights/marker.ts';
import { importRows, patternRows } from '../support/rights/patterns.ts';
import { peopleRows } from '../support/rights/people.ts';
import { planRows } from '../support/rights/plans.ts';
import { ASKERS, type Asked, type Asker, type Row, type Rows } from '../support/rights/row.ts';
import { tokenRows } from '../support/rights/tokens.ts';

const rows: Rows = {
  ...peopleRows,
  ...patternRows,
  ...editRows,
  ...importRows,
  ...planRows,
  ...tokenRows,
  ...accountRows,
  ...adminRows,
  ...instanceRows,
};

const document = describeInterface(describedNouns, { version: '0', cookie: 'session' });
const operations = Object.entries(document.paths).flatMap(([path, methods]) =>
  Object.entries(methods).map(([method, operation]) => ({
    key: `${method.toUpperCase()} ${path.replace(/\{(\w+)\}/g, ':$1')}`,
    operation,
  })),
);

let test: TestApp;
let people: Record<'owner' | 'other' | 'teacher' | 'admin', SignedIn>;
let tables: string[];
beforeAll(async () => {
  test = await testApp({ config: { hasMailbox: true } });
  people = {
    owner: await test.signedIn(),
    other: await test.signedIn(),
    teacher: await test.signedIn({ role: 'teacher' }),
    admin: await test.signedIn({ role: 'admin' }),
  };
  tables = await keptTables();
});

const ROLE = { other: 'member', teacher: 'teacher', admin: 'admin' } as const;

describe('the matrix of rights', () => {
  it('has a row for every route of the description, and none for what is not there', () => {
    expect(Object.keys(rows).sort()).toEqual(operations.map(({ key }) => key).sort());
  });

  it.each(operations)('$key', async ({ key, operation }) => {
    const row = rows[key];
    if (row === undefined) throw new Error('This route has no row in tests/support/rights.');
    const found: Record<string, unknown> = {};
    for (const asker of ASKERS) found[asker] = await tryAs(asker, key, operation, row);
    expect(found).toEqual(row.rights);
  });
});

/** The status, or in its place what else was wrong: an answer unlike its description, a refusal that changed something. */
async function tryAs(asker: Asker, key: string, operation: Operation, row: Row): Promise<unknown> {
  const { owner, session } = await sessionsOf(asker, row);
  const asked = (await row.ask?.({ test, owner, asker: session })) ?? {};
  const agent = await agentOf(asker, session, operation);
  // Where it is to succeed, something is to change.
  const before = row.rights[asker] < 400 ? null : await contents();
  const answer = await send(agent, key, asked);
  const wrong = unlikeDescription(document, operation, {
    status: answer.status,
    type: answer.type,
    body: answer.body,
  });
  if (answer.status >= 400 && before !== null && (await contents()) !== before)
    wrong.push('refused, and yet something changed');
  const mayKnow = asker === 'owner' || asker === 'rightScope';
  if (!mayKnow && JSON.stringify([answer.body, answer.text, answer.headers]).includes(MARKER)) {
    wrong.push('tells what is the owner’s');
  }
  return wrong.length === 0 ? answer.status : { status: answer.status, wrong };
}

/** The owner, and who asks: the same where nobody else does. Where the asker's account or session ends, both are new. */
async function sessionsOf(asker: Asker, row: Row): Promise<{ owner: SignedIn; session: SignedIn }> {
  const isNew = row.endsAsker === true;
  const owner = isNew ? await test.signedIn() : people.owner;
  if (asker !== 'other' && asker !== 'teacher' && asker !== 'admin') return { owner, session: owner };
  return { owner, session: isNew ? await test.signedIn({ role: ROLE[asker] }) : people[asker] };
}

async function agentOf(asker: Asker, session: SignedIn, operation: Operation): Promise<Agent> {
  if (asker === 'nobody') return test.anonymous();
  if (asker !== 'wrongScope' && asker !== 'rightScope') return session.agent;
  const needed = operation.security.flatMap((way) => way['token'] ?? []) as TokenScope[];
  const others = TOKEN_SCOPES.filter((scope) => !needed.includes(scope));
  // Where no scope would do, both are tokens that are allowed everything.
  const scopes = asker === 'wrongScope' || needed.length === 0 ? others : needed;
  return supertest.agent(test.app).set('Authorization', `Bearer ${await tokenOf(session, scopes)}`);
}

const tokens = new Map<string, string>();

async function tokenOf({ user, agent }: SignedIn, scopes: TokenScope[]): Promise<string> {
  const key = [user.id, ...scopes].join(' ');
  const known = tokens.get(key);
  if (known !== undefined) return known;
  const made = await agent.post('/api/tokens').send({ name: 'Script', scopes }).expect(201);
  const { token } = newTokenSchema.parse(made.body);
  tokens.set(key, token);
  return token;
}

function send(agent: Agent, key: string, { address = {}, query = {}, body, file }: Asked) {
  const [method = '', path = ''] = key.split(' ');
  const url = path.replace(/:(\w+)/g, (_all, name: string) => address[name] ?? '');
  const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  const request = agent[verb](url).query(query);
  if (file !== undefined) return request.attach('file', Buffer.from(file), 'table.csv');
  return body === undefined ? request : request.send(body);
}

/** Sessions, tokens and counters note that they were used; everything else stays as it is where a request is refused. */
const NOTING = ['session', 'access_token', 'rate_limit', '__drizzle_migrations'];

async function keptTables(): Promise<string[]> {
  const [found] = await test.db.execute(
    sql`SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE()`,
  );
  const names = z.array(z.object({ name: z.string() })).parse(found);
  return names.map(({ name }) => name).filter((name) => !NOTING.includes(name));
}

/** A sum over every row of every table. */
async function contents(): Promise<string> {
  const list = sql.join(
    tables.map((name) => sql.identifier(name)),
    sql`, `,
  );
  const [sums] = await test.db.execute(sql`CHECKSUM TABLE ${list} EXTENDED`);
  return JSON.stringify(sums);
}
