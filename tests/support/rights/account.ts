import { eq } from 'drizzle-orm';
import { user as userTable } from '../../../server/account/account.table.ts';
import { PASSWORD } from '../app.ts';
import { tokenIn } from '../outbox.ts';
import { codeOf } from '../totp.ts';
import { bySession, eachTheirOwn, everybody, ownPages, ownRecord, type Ground, type Rows } from './row.ts';

let count = 0;
const freshAddress = () => `rights-${(count += 1)}-${Date.now()}@example.org`;
const again = () => ({ body: { password: PASSWORD } });

const each = bySession(eachTheirOwn(200));
const openOnOwnPages = ownPages(everybody(200));

/** The link that confirms the owner's address, as it was mailed. */
async function confirmLink({ test, owner }: Ground) {
  await owner.agent.post('/api/auth/send-verification-email').send({}).expect(200);
  return { body: { token: await tokenIn(test.db, owner.user.email, 'confirm-address') } };
}

async function resetLink({ test, owner }: Ground) {
  const { email } = owner.user;
  await test.anonymous().post('/api/auth/request-password-reset').send({ email }).expect(200);
  const token = await tokenIn(test.db, email, 'reset-password');
  return { body: { token, newPassword: 'another quiet measure' } };
}

async function withConfirmedAddress({ test, asker }: Ground) {
  await test.db.update(userTable).set({ emailVerified: true }).where(eq(userTable.id, asker.user.id));
  return again();
}

async function factorBegun(ground: Ground) {
  const sent = await withConfirmedAddress(ground);
  const begun = await ground.asker.agent.post('/api/auth/two-factor/enable').send(sent.body).expect(200);
  return begun.body as { totpURI: string; backupCodes: string[] };
}

async function factorOn(ground: Ground) {
  const { totpURI, backupCodes } = await factorBegun(ground);
  const code = codeOf(totpURI, -1);
  await ground.asker.agent.post('/api/auth/two-factor/verify-totp').send({ code }).expect(200);
  return backupCodes;
}

async function aSession({ owner }: Ground) {
  const listed = await owner.agent.get('/api/account/sessions').expect(200);
  const [first] = (listed.body as { items: { id: string }[] }).items;
  return { address: { id: first?.id ?? 'none' } };
}

const signing: Rows = {
  'POST /api/auth/sign-up/email': {
    rights: openOnOwnPages,
    ask: () => ({ body: { name: 'New', email: freshAddress(), password: PASSWORD } }),
  },
  'POST /api/auth/sign-in/email': {
    rights: openOnOwnPages,
    endsAsker: true,
    ask: ({ asker }) => ({ body: { email: asker.user.email, password: PASSWORD } }),
  },
  'POST /api/auth/sign-out': { rights: openOnOwnPages, endsAsker: true, ask: () => ({ body: {} }) },
  'GET /api/auth/get-session': { rights: everybody(200) },
  'GET /api/me': { rights: openOnOwnPages },
};

const links: Rows = {
  'POST /api/auth/send-verification-email': { rights: each, ask: () => ({ body: {} }) },
  'POST /api/auth/verify-email': { rights: openOnOwnPages, endsAsker: true, ask: confirmLink },
  'POST /api/auth/request-password-reset': {
    rights: openOnOwnPages,
    ask: ({ owner }) => ({ body: { email: owner.user.email } }),
  },
  'POST /api/auth/reset-password': { rights: openOnOwnPages, endsAsker: true, ask: resetLink },
  'POST /api/auth/change-email': {
    rights: each,
    endsAsker: true,
    ask: () => ({ body: { newEmail: freshAddress(), password: PASSWORD } }),
  },
  'POST /api/auth/change-password': {
    rights: each,
    endsAsker: true,
    ask: () => ({ body: { currentPassword: PASSWORD, newPassword: 'another quiet measure' } }),
  },
};

const secondFactor: Rows = {
  'POST /api/auth/two-factor/enable': { rights: each, endsAsker: true, ask: withConfirmedAddress },
  'POST /api/auth/two-factor/verify-totp': {
    rights: each,
    endsAsker: true,
    ask: async (ground) => ({ body: { code: codeOf((await factorBegun(ground)).totpURI) } }),
  },
  'POST /api/auth/two-factor/verify-backup-code': {
    rights: each,
    endsAsker: true,
    ask: async (ground) => ({ body: { code: (await factorOn(ground))[0] } }),
  },
  'POST /api/auth/two-factor/generate-backup-codes': {
    rights: each,
    endsAsker: true,
    ask: async (ground) => {
      await factorOn(ground);
      return again();
    },
  },
  'POST /api/auth/two-factor/disable': {
    rights: each,
    endsAsker: true,
    ask: async (ground) => {
      await factorOn(ground);
      return again();
    },
  },
};

const ASKING = { body: { sentence: 'I teach dressmaking on Tuesdays.' } };

/** For members: a teacher need not ask, and neither need an administrator. */
const teaching: Rows = {
  'POST /api/account/teacher-request': {
    rights: { ...bySession(eachTheirOwn(201)), teacher: 409, admin: 409 },
    endsAsker: true,
    ask: () => ASKING,
  },
  'DELETE /api/account/teacher-request': {
    rights: { ...bySession(eachTheirOwn(204)), teacher: 404, admin: 404 },
    endsAsker: true,
    ask: async ({ asker }) => {
      const isMember = asker.user.role === 'member';
      const asked = asker.agent.post('/api/account/teacher-request').send(ASKING.body);
      await asked.expect(isMember ? 201 : 409);
      return {};
    },
  },
};

export const accountRows: Rows = {
  ...signing,
  ...links,
  ...secondFactor,
  ...teaching,
  'GET /api/account': { rights: each },
  'PATCH /api/account': { rights: each, ask: () => ({ body: { name: 'Renamed' } }) },
  'DELETE /api/account': { rights: bySession(eachTheirOwn(204)), endsAsker: true, ask: again },
  'GET /api/account/sessions': { rights: each },
  'DELETE /api/account/sessions': { rights: bySession(eachTheirOwn(204)) },
  'DELETE /api/account/sessions/:id': {
    rights: bySession(ownRecord(204)),
    endsAsker: true,
    ask: aSession,
  },
  'POST /api/account/export': { rights: each },
};
