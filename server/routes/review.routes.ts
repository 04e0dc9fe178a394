import { acceptApplication } from '../services/review/accept-application';
import { declineApplication } from '../services/review/decline-application';
import { decideCountersign } from '../services/review/decide-countersign';
import { disposeFinding } from '../services/review/dispose-finding';
import { handOverApplication } from '../services/review/hand-over-application';
import { putBackApplication } from '../services/review/put-back-application';
import { returnApplication } from '../services/review/return-application';
import { takeApplication } from '../services/review/take-application';
import { getApplication } from '../services/reads/get-application';
import { getFinding } from '../services/reads/get-finding';
import { getCountersign, listCountersigns } from '../services/reads/list-countersigns';
import { listReviewers } from '../services/reads/list-reviewers';
import { route, type Route } from './route';

const REVIEW = { can: 'review', on: 'Application' } as const;
const DECIDE = { can: 'decide', on: 'Application' } as const;

/** A reviewer's steps with a case. */
const stepRoutes: Route[] = [
  route('takeApplication', {
    summary: 'Take a filed case; of many at once one has it',
    access: REVIEW,
    answers: { 200: 'application' },
    idempotent: true,
    handler: async (call) => {
      await takeApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('handOverApplication', {
    summary: 'Hand a case over to another reviewer',
    access: REVIEW,
    answers: { 200: 'application' },
    idempotent: true,
    handler: async (call) => {
      await handOverApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('putBackApplication', {
    summary: 'Put a case back into the queue',
    access: REVIEW,
    answers: { 200: 'application' },
    idempotent: true,
    handler: async (call) => {
      await putBackApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('returnApplication', {
    summary: 'Return a case with its open discrepancies; the letter goes out',
    access: REVIEW,
    answers: { 200: 'application' },
    idempotent: true,
    handler: async (call) => {
      await returnApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('acceptApplication', {
    summary: 'Accept the current revision',
    access: DECIDE,
    answers: { 200: 'application' },
    idempotent: true,
    handler: async (call) => {
      await acceptApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('declineApplication', {
    summary: 'Propose to decline; a second reviewer countersigns',
    access: DECIDE,
    answers: { 202: 'application' },
    idempotent: true,
    handler: async (call) => {
      await declineApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('listReviewers', {
    summary: 'Reviewers who may have a case',
    access: REVIEW,
    answers: { 200: 'reviewer-list' },
    handler: (call) => listReviewers(call, call.params.applicationId),
  }),
];

/** What becomes of findings, and the second reviewer's word. */
const findingRoutes: Route[] = [
  route('waiveFinding', {
    summary: 'Waive a finding; a Must answer waits for a second reviewer',
    access: REVIEW,
    answers: { 200: 'finding' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, fingerprint } = call.params;
      await disposeFinding(call, applicationId, fingerprint, 'waived', call.body);
      return getFinding(call, applicationId, fingerprint);
    },
  }),
  route('setAsideFinding', {
    summary: 'Set a Note or an Explain aside',
    access: REVIEW,
    answers: { 200: 'finding' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, fingerprint } = call.params;
      await disposeFinding(call, applicationId, fingerprint, 'set-aside', call.body);
      return getFinding(call, applicationId, fingerprint);
    },
  }),
  route('listCountersigns', {
    summary: 'Proposals for a second reviewer',
    access: { can: 'read', on: 'Countersign' },
    answers: { 200: 'countersign-list' },
    handler: (call) => listCountersigns(call, call.query),
  }),
  route('decideCountersign', {
    summary: 'Agree to a proposal, or refuse it',
    access: { can: 'countersign', on: 'Countersign' },
    answers: { 200: 'countersign' },
    idempotent: true,
    handler: async (call) => {
      await decideCountersign(call, call.params.countersignId, call.body);
      return getCountersign(call, call.params.countersignId);
    },
  }),
];

export const reviewRoutes = [...stepRoutes, ...findingRoutes];
