import { eq } from 'drizzle-orm';
import { outbox } from '../../../server/mail/mail.table.ts';
import { writeMail } from '../../../server/mail/outbox.store.ts';
import { administrators, type Ground, type Rows } from './row.ts';

async function aRequest({ owner }: Ground) {
  const sentence = 'I teach dressmaking on Tuesdays.';
  const asked = await owner.agent.post('/api/account/teacher-request').send({ sentence }).expect(201);
  return { address: { id: (asked.body as { id: string }).id }, body: { accept: true } };
}

async function aFailedMail({ test, owner }: Ground) {
  const id = await writeMail(test.db, test.config.mailFrom, {
    to: owner.user.email,
    userId: owner.user.id,
    kind: 'confirm-address',
    letter: { subject: 'Any', greets: null, lines: [], link: null, after: [] },
  });
  await test.db.update(outbox).set({ state: 'failed' }).where(eq(outbox.id, id));
  return { address: { id } };
}

export const adminRows: Rows = {
  'GET /api/admin/people': { rights: administrators(200) },
  'PATCH /api/admin/people/:id': {
    rights: administrators(200),
    endsAsker: true,
    ask: ({ owner }) => ({ address: { id: owner.user.id }, body: { role: 'teacher' } }),
  },
  'GET /api/admin/teacher-requests': { rights: administrators(200) },
  'POST /api/admin/teacher-requests/:id/answer': {
    rights: administrators(200),
    endsAsker: true,
    ask: aRequest,
  },
  'GET /api/admin/mail': { rights: administrators(200) },
  'POST /api/admin/mail/:id/retry': { rights: administrators(200), ask: aFailedMail },
  'GET /api/admin/log': { rights: administrators(200) },
  'GET /api/admin/health': { rights: administrators(200) },
  'GET /api/admin/reference': { rights: administrators(200) },
  'GET /api/metrics': { rights: administrators(200) },
};
