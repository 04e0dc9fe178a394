import { Answer, route } from './route';
import type { Transaction } from '../database/transaction';
import { notFound } from '../errors/problem';
import { presentInvitation, presentOrganisation, presentPerson } from '../presenters/people.presenter';
import { readDirectory, readOrganisations } from '../repositories/directory.repository';
import { listInvitations } from '../repositories/invitation.repository';
import {
  approveInvitation,
  createOrganisation,
  invitePerson,
  refuseInvitation,
} from '../services/people/invite-people';
import { barReviewer, grantRole, removeRole, setPersonStatus } from '../services/people/manage-roles';

async function person(tx: Transaction, userId: string) {
  const [entry] = await readDirectory(tx.manager, [userId]);
  if (!entry) throw notFound();
  return presentPerson(entry);
}

/** People and organisations, for administrators. */
export const peopleRoutes = [
  route('listPeople', {
    summary: 'Everybody with an account',
    access: { can: 'administer', on: 'User' },
    answers: { 200: 'people-list' },
    handler: async ({ tx }) => ({ items: (await readDirectory(tx.manager)).map(presentPerson) }),
  }),
  route('setPersonStatus', {
    summary: 'Shut an account out, or let it in again',
    access: { can: 'administer', on: 'User' },
    answers: { 200: 'people-entry' },
    idempotent: true,
    handler: async ({ tx, ability, params, body }) => {
      await setPersonStatus(tx, ability, { ...params, ...body });
      return person(tx, params.userId);
    },
  }),
  route('grantRole', {
    summary: 'Give somebody a role in an organisation; never oneself',
    access: { can: 'administer', on: 'Membership' },
    answers: { 200: 'people-entry' },
    handler: async ({ tx, ability, params, body }) => {
      await grantRole(tx, ability, { ...params, ...body });
      return person(tx, params.userId);
    },
  }),
  route('removeRole', {
    summary: 'Take a role away; never one’s own',
    access: { can: 'administer', on: 'Membership' },
    answers: { 200: 'people-entry' },
    handler: async ({ tx, ability, params }) => {
      await removeRole(tx, ability, params);
      return person(tx, params.userId);
    },
  }),
  route('barReviewer', {
    summary: 'Keep a reviewer from an organisation’s cases',
    access: { can: 'administer', on: 'User' },
    answers: { 201: 'people-entry' },
    idempotent: true,
    handler: async ({ tx, ability, params, body }) => {
      await barReviewer(tx, ability, { ...params, ...body });
      return new Answer(await person(tx, params.userId), 201);
    },
  }),
  route('listOrganisations', {
    summary: 'All organisations',
    access: { can: 'administer', on: 'Organisation' },
    answers: { 200: 'organisation-list' },
    handler: async ({ tx }) => ({ items: (await readOrganisations(tx.manager)).map(presentOrganisation) }),
  }),
  route('createOrganisation', {
    summary: 'A new applicant organisation',
    access: { can: 'create', on: 'Organisation' },
    answers: { 201: 'organisation' },
    idempotent: true,
    handler: async ({ tx, body }) => {
      const { id } = await createOrganisation(tx, body.name);
      const [row] = await readOrganisations(tx.manager, id);
      if (!row) throw notFound();
      return new Answer(presentOrganisation(row), 201);
    },
  }),
  route('listInvitations', {
    summary: 'Invitations, and accounts that were asked for',
    access: { can: 'administer', on: 'Invitation' },
    answers: { 200: 'invitation-list' },
    handler: async ({ tx }) => ({ items: (await listInvitations(tx.manager)).map(presentInvitation) }),
  }),
  route('invitePerson', {
    summary: 'Invite somebody by mail',
    access: { can: 'create', on: 'Invitation' },
    answers: { 201: 'invitation' },
    idempotent: true,
    handler: async ({ tx, actor, body }) =>
      new Answer(presentInvitation(await invitePerson(tx, actor, body)), 201),
  }),
  route('approveInvitation', {
    summary: 'Grant an account that was asked for, or send an invitation again',
    access: { can: 'update', on: 'Invitation' },
    answers: { 200: 'invitation' },
    idempotent: true,
    handler: async ({ tx, actor, params, body }) =>
      presentInvitation(await approveInvitation(tx, actor, { ...params, ...body })),
  }),
  route('refuseInvitation', {
    summary: 'Refuse an account that was asked for, or take an invitation back',
    access: { can: 'update', on: 'Invitation' },
    answers: { 200: 'invitation' },
    idempotent: true,
    handler: async ({ tx, actor, params, body }) =>
      presentInvitation(await refuseInvitation(tx, actor, { ...params, ...body })),
  }),
];
