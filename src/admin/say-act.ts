import type { AdminAct } from '../../shared/admin/log.schema.ts';
import { ROLES, type Role } from '../../shared/me.ts';
import { ROLE_WORDS } from './role-words.ts';

const roleOf = (text: string | undefined): Role | undefined => ROLES.find((role) => role === text);
const oneOf = (text: string | undefined): string => {
  const role = roleOf(text);
  return role === undefined ? (text ?? 'another role') : ROLE_WORDS[role].one;
};

/** One act as a sentence: “Ada Lind made Ines Varga a teacher; before, a member.” */
export function sayAct({ by, on, through, action, detail }: AdminAct): string {
  const who = by?.name ?? (through === 'command' ? 'A command on the machine' : 'An account deleted since');
  const whom = on?.name ?? 'an account deleted since';
  const before = detail.from === undefined ? '' : `; before, ${oneOf(detail.from)}`;
  switch (action) {
    case 'administratorMade':
      return `${who} made ${whom} an administrator${before}.`;
    case 'roleChanged':
      return `${who} made ${whom} ${oneOf(detail.to)}${before}.`;
    case 'teacherRequestAccepted':
      return `${who} made ${whom} a teacher, as they had asked.`;
    case 'teacherRequestDeclined':
      return `${who} declined the request of ${whom} to teach.`;
    case 'mailRetried':
      return `${who} sent a mail on its way again.`;
  }
}
