import { notFound } from '../errors/problem';
import { demoAccounts } from '../services/accounts/demo-accounts';
import { openRoute } from './route';

/** The demo's accounts, for the sign-in page. Without the demo they do not exist. */
export const demoRoutes = [
  openRoute('listDemoAccounts', {
    summary: 'Accounts of the demo',
    access: 'anyone',
    answers: { 200: 'demo-account-list' },
    handler: async ({ context }) => {
      if (!context.config.demo) throw notFound();
      return { items: demoAccounts() };
    },
  }),
];
