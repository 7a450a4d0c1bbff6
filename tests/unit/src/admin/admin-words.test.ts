import { describe, expect, it } from 'vitest';
import type { AdminAct } from '../../../../shared/admin/log.schema.ts';
import type { AdminMail } from '../../../../shared/admin/mail.schema.ts';
import { sayMailError, sayMailKind, sayMailState } from '../../../../src/admin/mail-words.ts';
import { sayAct } from '../../../../src/admin/say-act.ts';
import { sayBytes, sayDuration } from '../../../../src/admin/say-health.ts';

const ID = '0190a000-0000-7000-8000-000000000001';

describe('sayAct', () => {
  const act: AdminAct = {
    id: ID,
    at: '2026-12-01T12:00:00Z',
    by: { id: ID, name: 'Ada' },
    through: 'page',
    action: 'roleChanged',
    on: { id: ID, name: 'Ines' },
    detail: { from: 'member', to: 'teacher' },
  };
  it.each<[string, Partial<AdminAct>]>([
    ['Ada made Ines a teacher; before, a member.', {}],
    [
      'A command on the machine made Ines an administrator; before, a member.',
      { action: 'administratorMade', by: null, through: 'command', detail: { from: 'member', to: 'admin' } },
    ],
    [
      'An account deleted since made an account deleted since a teacher; before, a member.',
      { by: null, on: null },
    ],
    ['Ada made Ines a teacher, as they had asked.', { action: 'teacherRequestAccepted', detail: {} }],
    ['Ada declined the request of Ines to teach.', { action: 'teacherRequestDeclined', detail: {} }],
    ['Ada sent a mail on its way again.', { action: 'mailRetried', on: null, detail: { mailId: ID } }],
  ])('%s', (words, change) => {
    expect(sayAct({ ...act, ...change })).toBe(words);
  });
});

describe('the words of mail', () => {
  const mail: AdminMail = {
    id: ID,
    to: 'ines@example.org',
    kind: 'reset-password',
    state: 'failed',
    attempts: 9,
    nextAt: '2026-12-01T12:00:00Z',
    createdAt: '2026-12-01T12:00:00Z',
    sentAt: null,
    lastError: null,
  };
  it('say what is known of a kind, and an unknown one as it is kept', () => {
    expect(sayMailKind('reset-password')).toBe('Choose a new password');
    expect(sayMailKind('something-new')).toBe('something new');
  });
  it('count the tries', () => {
    expect(sayMailState(mail)).toBe('Given up, tried 9 times');
    expect(sayMailState({ ...mail, state: 'sending', attempts: 1 })).toBe('Being sent, tried once');
    expect(sayMailState({ ...mail, state: 'waiting', attempts: 0 })).toMatch(/^Next try .*, not tried yet$/);
    expect(sayMailState({ ...mail, state: 'sent', sentAt: mail.createdAt })).toMatch(/^Sent 1 December 2026/);
  });
  it('say a code in words beside it, and an unknown one alone', () => {
    expect(sayMailError('EENVELOPE 550')).toBe('The mail server refused the address (EENVELOPE 550)');
    expect(sayMailError('the link in it has run out')).toBe('the link in it has run out');
  });
});

describe('the words of health', () => {
  it.each([
    [0, 'less than a minute'],
    [59.9, 'less than a minute'],
    [60, '1 minute'],
    [3600, '1 hour'],
    [3661, '1 hour and 1 minute'],
    [86_400 * 3 + 3600 * 4 + 60, '3 days and 4 hours'],
    [86_400 + 60, '1 day'],
  ])('%d s is %s', (seconds, words) => {
    expect(sayDuration(seconds)).toBe(words);
  });
  it.each([
    [0, '0 bytes'],
    [999, '999 bytes'],
    [1000, '1.0 kB'],
    [12_340_000_000, '12.3 GB'],
    [5e15, '5000.0 TB'],
  ])('%d bytes are %s', (bytes, words) => {
    expect(sayBytes(bytes)).toBe(words);
  });
});
