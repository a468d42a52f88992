import type { Metadata } from 'next';
import Link from 'next/link';
import { type Column, DataTable } from '@/components/ui/data-table';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { deskPage } from '@/lib/auth/desk-page';
import { listPeople, type PersonView } from '@/lib/services/people/list-people';
import { roleNames } from '../_components/role-names';
import { AddPerson } from './_components/add-person';
import { ChangePerson } from './_components/change-person';
import { addPersonAction, renewCodeAction, setDisabledAction, setRolesAction } from './actions';

export const metadata: Metadata = { title: 'People' };

const STATES: Record<PersonView['state'], string> = {
  active: 'Active',
  invited: 'Has a sign-in code',
  disabled: 'Disabled',
};

export default async function PeoplePage() {
  const { people, self } = await deskPage((actor, ctx) => ({
    people: listPeople(actor, ctx),
    self: actor.publicId,
  }));
  const active = people.filter((person) => person.state === 'active').length;
  return (
    <>
      <PageTitle title="People" sub="Who may sign in, and what their roles let them do." />
      <NextBar actions={<AddPerson add={addPersonAction} />}>
        <strong>
          {active} of {people.length} can sign in now.
        </strong>{' '}
        Somebody new gets a one-time code from you; no mail is sent.
      </NextBar>
      <DataTable
        caption="People of this desk"
        hideCaption
        columns={columnsFor(self)}
        rows={people}
        rowKey={(person) => person.id}
      />
    </>
  );
}

function columnsFor(self: string): Column<PersonView>[] {
  const actions = { setRoles: setRolesAction, setDisabled: setDisabledAction, renewCode: renewCodeAction };
  return [
    {
      key: 'name',
      head: 'Name',
      rowHead: true,
      cell: ({ id, name }) => (
        <>
          <span className="font-semibold">{name}</span>
          {id === self ? <span className="text-soft"> (you)</span> : null}
        </>
      ),
    },
    { key: 'email', head: 'Email', from: 'md', cell: ({ email }) => email },
    { key: 'roles', head: 'Roles', cell: ({ roles }) => roleNames(roles) },
    { key: 'state', head: 'State', cell: ({ state }) => STATES[state] },
    {
      key: 'history',
      head: 'History',
      from: 'lg',
      cell: ({ id, name }) => (
        <Link href={`/history?entity=${id}`}>
          Entries<span className="sr-only"> about {name}</span>
        </Link>
      ),
    },
    {
      key: 'change',
      head: <span className="sr-only">Change</span>,
      cell: ({ id, name, roles, state, version }) => (
        <ChangePerson person={{ id, name, roles, state, version, isSelf: id === self }} actions={actions} />
      ),
    },
  ];
}
