import { useSuspenseQuery, type QueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import type { AdminPerson } from '../../shared/admin/people.schema.ts';
import { ROLES, type Role } from '../../shared/me.ts';
import { paths } from '../paths.ts';
import { AddressSelect, readChoice } from '../ui/address-select.tsx';
import { AlertDialog } from '../ui/alert-dialog.tsx';
import { TextLink } from '../ui/link.tsx';
import { printMomentDay } from '../ui/moment.ts';
import { Pagination, readListAddress } from '../ui/pagination.tsx';
import { SearchBox } from '../ui/search-box.tsx';
import { SentenceSelect } from '../ui/sentence-select.tsx';
import { RowHead, Table, Td, Th } from '../ui/table.tsx';
import { failureWords } from '../ui/use-server-errors.ts';
import { AdminFrame, NothingListed } from './admin-frame.tsx';
import { adminPeopleQuery, useChangeRole } from './queries.ts';
import { ROLE_OPTIONS, ROLE_WORDS } from './role-words.ts';

type RoleAsked = Role | 'every';

function readAddress(url: string) {
  const role = readChoice<RoleAsked>(url, 'role', ROLES, 'every');
  return { ...readListAddress(url), role };
}

const queryOf = ({ page, q, role }: ReturnType<typeof readAddress>) =>
  adminPeopleQuery(page, q, role === 'every' ? null : role);

export const loader =
  (client: QueryClient) =>
  ({ request }: LoaderFunctionArgs) =>
    client.query(queryOf(readAddress(request.url)));

export function Component() {
  const [search] = useSearchParams();
  const asked = readAddress(`?${search.toString()}`);
  const { data } = useSuspenseQuery(queryOf(asked));
  const [change, setChange] = useState<RoleChange | null>(null);
  return (
    <AdminFrame
      title="Accounts"
      lead="Who is here and what each may do. What they keep is theirs: it is not shown here. Choosing another role asks before it changes."
    >
      <div className="mt-7 flex flex-wrap items-end gap-x-10 gap-y-5">
        <SearchBox label="Find by name or e-mail address" />
        <p className="pb-2 text-lead text-ink-2" role="status">
          {data.total === 1 ? '1 account' : `${data.total} accounts`},{' '}
          <AddressSelect<RoleAsked>
            label="Role"
            name="role"
            value={asked.role}
            usual="every"
            options={[{ value: 'every', label: 'every role', inList: 'Every role' }, ...ROLE_OPTIONS]}
          />
        </p>
      </div>
      {data.items.length === 0 ? (
        <NothingListed>
          No account has these words and this role.{' '}
          <TextLink to={paths.adminPeople}>Show all accounts</TextLink>
        </NothingListed>
      ) : (
        <div className="mt-5">
          <Table label="Accounts">
            <thead>
              <tr>
                <Th>Name</Th>
                <Th>Role</Th>
                <Th className="max-md:hidden">Address</Th>
                <Th className="max-md:hidden">Since</Th>
              </tr>
            </thead>
            <tbody>
              {data.items.map((person) => (
                <PersonRow key={person.id} person={person} onChoose={(role) => setChange({ person, role })} />
              ))}
            </tbody>
          </Table>
        </div>
      )}
      <Pagination page={data.page} pageSize={data.pageSize} total={data.total} />
      <RoleDialog change={change} onClose={() => setChange(null)} />
    </AdminFrame>
  );
}

function PersonRow({ person, onChoose }: { person: AdminPerson; onChoose: (role: Role) => void }) {
  const { name, email, role, emailVerified, createdAt, asksToTeach } = person;
  const confirmed = emailVerified ? 'confirmed' : 'not confirmed';
  return (
    <tr>
      <RowHead className="break-words md:w-[45%] [overflow-wrap:anywhere]">
        {name}
        <span className="block text-note font-normal text-ink-2">{email}</span>
        <span className="block text-note font-normal text-ink-2 md:hidden">
          {confirmed}, since {printMomentDay(createdAt)}
        </span>
      </RowHead>
      <Td>
        <SentenceSelect
          label={`Role of ${name}`}
          value={role}
          options={ROLE_OPTIONS}
          onChange={(next) => {
            if (next !== role) onChoose(next);
          }}
        />
        {asksToTeach && (
          <TextLink to={paths.adminRequests} className="mt-1 block text-note">
            asks to teach
          </TextLink>
        )}
      </Td>
      <Td className="text-note max-md:hidden">{confirmed}</Td>
      <Td className="text-note whitespace-nowrap max-md:hidden">{printMomentDay(createdAt)}</Td>
    </tr>
  );
}

interface RoleChange {
  person: AdminPerson;
  role: Role;
}

function RoleDialog({ change, onClose }: { change: RoleChange | null; onClose: () => void }) {
  const act = useChangeRole();
  const close = () => {
    act.reset();
    onClose();
  };
  if (change === null) return null;
  const { person, role } = change;
  return (
    <AlertDialog
      isOpen
      title={`Make ${person.name} ${ROLE_WORDS[role].one}?`}
      cancel={`Leave ${ROLE_WORDS[person.role].one.replace(/^an? /, 'as ')}`}
      confirm={`Make ${ROLE_WORDS[role].one}`}
      pending={act.isPending}
      error={act.isError ? failureWords(act.error) : undefined}
      onCancel={close}
      onConfirm={() => act.mutate({ id: person.id, role }, { onSuccess: close })}
    >
      <p className="break-words">
        {person.email} is {ROLE_WORDS[person.role].one} now.
      </p>
      <p>{ROLE_WORDS[role].may} It is written into the log.</p>
    </AlertDialog>
  );
}
