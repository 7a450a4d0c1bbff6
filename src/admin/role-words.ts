import { ROLES, type Role } from '../../shared/me.ts';

/** A role with its article, and what it may do. */
export const ROLE_WORDS: Record<Role, { one: string; may: string }> = {
  member: { one: 'a member', may: 'Members keep their own people, patterns and plans, and nobody else’s.' },
  teacher: {
    one: 'a teacher',
    may: 'Teachers can also open classes, and see there what learners share with that class.',
  },
  admin: {
    one: 'an administrator',
    may: 'Administrators see every account’s name and address and give roles, but nobody’s measurements.',
  },
};

export const ROLE_OPTIONS = ROLES.map((value) => {
  const word = ROLE_WORDS[value].one.replace(/^an? /, '');
  return { value, label: word, inList: word.charAt(0).toUpperCase() + word.slice(1) };
});
