import { Answer, openRoute, route } from './route';
import { asSystem } from '../database/transaction';
import { presentSession } from '../presenters/session.presenter';
import { changePassword } from '../services/session/change-password';
import { signIn } from '../services/session/sign-in';
import { switchOrganisation } from '../services/session/switch-organisation';
import { enrolTotp, verifyTotp } from '../services/session/verify-totp';

/** Signing in, its second step, and out again. */
export const sessionRoutes = [
  openRoute('getSession', {
    summary: 'Who is signed in',
    access: 'anyone',
    answers: { 200: 'session' },
    handler: async ({ tx, context, session }) => presentSession(tx, context, session.state),
  }),
  openRoute('signIn', {
    summary: 'Sign in with email and password; 202 where a second step is to come',
    access: 'anyone',
    answers: { 200: 'session', 202: 'next-step' },
    handler: async ({ tx, context, session, body, address }) => {
      const { state, next } = await signIn(tx, context, session, { email: body.email, address });
      return next ? new Answer({ next }, 202) : presentSession(tx, context, state);
    },
  }),
  openRoute('verifyTotp', {
    summary: 'The second step: the code of the authenticator',
    access: 'half-signed-in',
    answers: { 200: 'session' },
    handler: async ({ tx, context, session, body, address }) =>
      presentSession(tx, context, await verifyTotp(tx, context, session, { code: body.code, address })),
  }),
  openRoute('enrolTotp', {
    summary: 'A new second factor, to be confirmed with its first code',
    access: 'half-signed-in',
    answers: { 200: 'totp-enrolment' },
    handler: async ({ tx, context, session }) => enrolTotp(tx, context, session),
  }),
  route('signOut', {
    summary: 'Sign out; the session is gone',
    access: 'signed-in',
    answers: { 200: 'done' },
    handler: async ({ session }) => {
      await session.end();
      return new Answer({ done: true as const }, 200, { 'Clear-Site-Data': '"cache"' });
    },
  }),
  route('switchOrganisation', {
    summary: 'Act for another of the own organisations',
    access: 'signed-in',
    answers: { 200: 'session' },
    handler: async ({ tx, actor, context, session, body }) => {
      const state = await switchOrganisation(tx, actor, session, body.organisationId);
      return asSystem(tx, () => presentSession(tx, context, state));
    },
  }),
  route('changePassword', {
    summary: 'A new password in place of the present one; all other sessions end',
    access: 'signed-in',
    answers: { 200: 'session' },
    handler: async ({ tx, actor, context, session, body }) => {
      const state = await changePassword(tx, actor, session, body);
      return asSystem(tx, () => presentSession(tx, context, state));
    },
  }),
];
