import { mailboxMessage } from '../../../server/mailbox/mailbox.table.ts';
import { newId } from '../../../server/db/columns.ts';
import { everybody, type Ground, type Rows } from './row.ts';

async function aMessage({ test }: Ground) {
  const id = newId();
  const said = {
    from: 'a@example.org',
    to: 'b@example.org',
    subject: 'Any',
    text: 'Any',
    html: '<p>Any</p>',
  };
  const messageId = `<${id}@example.org>`;
  await test.db.insert(mailboxMessage).values({ id, ...said, messageId, receivedAt: new Date() });
  return { address: { id } };
}

/** The mailbox is everybody's on this machine, where it is open at all: its own tests say where it is not. */
export const instanceRows: Rows = {
  'GET /api/health': { rights: everybody(200) },
  'GET /api/openapi.json': { rights: everybody(200) },
  'GET /api/mailbox': { rights: everybody(200) },
  'GET /api/mailbox/:id': { rights: everybody(200), ask: aMessage },
};
