import { Answer, openRoute } from './route';
import { acceptInvitation } from '../services/accounts/accept-invitation';
import { askForAccount } from '../services/accounts/ask-for-account';
import { askForReset, resetPassword } from '../services/accounts/reset-password';
import { setUp } from '../services/accounts/set-up';

const done = { done: true as const };

/** Ways to an account, for people who have none or cannot get in. */
export const accountRoutes = [
  openRoute('askForAccount', {
    summary: 'Ask for an account; an administrator decides',
    access: 'anyone',
    answers: { 202: 'done' },
    handler: async ({ tx, context, body, address }) => {
      await askForAccount(tx, context, body, address);
      return new Answer(done, 202);
    },
  }),
  openRoute('acceptInvitation', {
    summary: 'Take an account up with the token of the mail',
    access: 'anyone',
    answers: { 200: 'done' },
    handler: async ({ tx, body }) => {
      await acceptInvitation(tx, body);
      return done;
    },
  }),
  openRoute('askForReset', {
    summary: 'Have a link for a new password mailed; the answer is always the same',
    access: 'anyone',
    answers: { 202: 'done' },
    handler: async ({ tx, context, body, address }) => {
      await askForReset(tx, context, body.email, address);
      return new Answer(done, 202);
    },
  }),
  openRoute('resetPassword', {
    summary: 'A new password with the token of the mail',
    access: 'anyone',
    answers: { 200: 'done' },
    handler: async ({ tx, body }) => {
      await resetPassword(tx, body);
      return done;
    },
  }),
  openRoute('setUp', {
    summary: 'The first start: the grid owner and its first administrator',
    access: 'anyone',
    answers: { 201: 'done' },
    handler: async ({ tx, context, body }) => {
      await setUp(tx, context, body);
      return new Answer(done, 201);
    },
  }),
];
