import { getRules, listConductors } from '../services/rules/get-rules';
import { route } from './route';

/** What filings are weighed against, for everybody who is signed in. */
export const rulesRoutes = [
  route('getRules', {
    summary: 'The rules in force',
    access: { can: 'read', on: 'RuleSet' },
    answers: { 200: 'rules' },
    handler: (call) => getRules(call),
  }),
  route('listConductors', {
    summary: 'The conductor library',
    access: { can: 'read', on: 'Conductor' },
    answers: { 200: 'conductor-list' },
    handler: (call) => listConductors(call),
  }),
];
