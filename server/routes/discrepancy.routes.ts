import { answerDiscrepancy } from '../services/discrepancies/answer-discrepancy';
import { raiseDiscrepancy } from '../services/discrepancies/raise-discrepancy';
import { remarkOnDiscrepancy } from '../services/discrepancies/remark-on-discrepancy';
import { reopenDiscrepancy, settleDiscrepancy } from '../services/discrepancies/settle-discrepancy';
import { getDiscrepancy, listDiscrepancies } from '../services/reads/list-discrepancies';
import { route } from './route';

/** Discrepancies with their threads. */
export const discrepancyRoutes = [
  route('listDiscrepancies', {
    summary: 'Discrepancies of an application with their threads',
    access: { can: 'read', on: 'Discrepancy' },
    answers: { 200: 'discrepancy-list' },
    handler: (call) => listDiscrepancies(call, call.params.applicationId),
  }),
  route('raiseDiscrepancy', {
    summary: 'Raise a discrepancy from findings or by hand',
    access: { can: 'create', on: 'Discrepancy' },
    answers: { 201: 'discrepancy' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId } = call.params;
      return getDiscrepancy(call, applicationId, await raiseDiscrepancy(call, applicationId, call.body));
    },
  }),
  route('answerDiscrepancy', {
    summary: 'Answer by a change or an explanation, or keep the words for later',
    access: { can: 'answer', on: 'Discrepancy' },
    answers: { 200: 'discrepancy' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, number } = call.params;
      await answerDiscrepancy(call, applicationId, Number(number), call.body);
      return getDiscrepancy(call, applicationId, Number(number));
    },
  }),
  route('settleDiscrepancy', {
    summary: 'Settle a discrepancy and its findings',
    access: { can: 'review', on: 'Discrepancy' },
    answers: { 200: 'discrepancy' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, number } = call.params;
      await settleDiscrepancy(call, applicationId, Number(number), call.body);
      return getDiscrepancy(call, applicationId, Number(number));
    },
  }),
  route('reopenDiscrepancy', {
    summary: 'Ask again',
    access: { can: 'review', on: 'Discrepancy' },
    answers: { 200: 'discrepancy' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, number } = call.params;
      await reopenDiscrepancy(call, applicationId, Number(number), call.body);
      return getDiscrepancy(call, applicationId, Number(number));
    },
  }),
  route('remarkOnDiscrepancy', {
    summary: 'Add words to a thread',
    access: { can: 'read', on: 'Discrepancy' },
    answers: { 200: 'discrepancy' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, number } = call.params;
      await remarkOnDiscrepancy(call, applicationId, Number(number), call.body.text);
      return getDiscrepancy(call, applicationId, Number(number));
    },
  }),
];
