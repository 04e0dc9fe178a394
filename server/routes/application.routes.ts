import { createApplication } from '../services/drafts/create-application';
import { updateApplication } from '../services/drafts/update-application';
import { withdrawApplication } from '../services/drafts/withdraw-application';
import { amendApplication } from '../services/drafts/amend-application';
import { fileApplication } from '../services/filing/file-application';
import { getApplication } from '../services/reads/get-application';
import { getTimeline } from '../services/reads/get-timeline';
import { listApplications, listQueue } from '../services/reads/list-applications';
import { route } from './route';

/** Applications as a whole: lists, particulars, and the applicant's own steps. */
export const applicationRoutes = [
  route('listApplications', {
    summary: 'Applications, a page',
    access: { can: 'read', on: 'Application' },
    answers: { 200: 'application-list' },
    handler: (call) => listApplications(call, call.query),
  }),
  route('listQueue', {
    summary: 'Open applications with their due days, a page',
    access: { can: 'review', on: 'Application' },
    answers: { 200: 'queue' },
    handler: (call) => listQueue(call, call.query),
  }),
  route('createApplication', {
    summary: 'Open an application',
    access: { can: 'create', on: 'Application' },
    answers: { 201: 'application' },
    idempotent: true,
    handler: async (call) => getApplication(call, await createApplication(call, call.body)),
  }),
  route('getApplication', {
    summary: 'An application by id or number',
    access: { can: 'read', on: 'Application' },
    answers: { 200: 'application' },
    handler: (call) => getApplication(call, call.params.applicationId),
  }),
  route('updateApplication', {
    summary: 'Change the particulars while it is the applicant’s turn',
    access: { can: 'update', on: 'Application' },
    answers: { 200: 'application' },
    idempotent: true,
    versioned: true,
    handler: async (call) => {
      await updateApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('fileApplication', {
    summary: 'File the draft: the next revision is frozen and checked',
    access: { can: 'file', on: 'Application' },
    answers: { 200: 'application' },
    idempotent: true,
    handler: async (call) => {
      await fileApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('withdrawApplication', {
    summary: 'Withdraw the open round',
    access: { can: 'withdraw', on: 'Application' },
    answers: { 200: 'application' },
    idempotent: true,
    handler: async (call) => {
      await withdrawApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('amendApplication', {
    summary: 'Open an amendment of an accepted application',
    access: { can: 'amend', on: 'Application' },
    answers: { 200: 'application' },
    idempotent: true,
    handler: async (call) => {
      await amendApplication(call, call.params.applicationId, call.body);
      return getApplication(call, call.params.applicationId);
    },
  }),
  route('getTimeline', {
    summary: 'What happened to an application',
    access: { can: 'read', on: 'Application' },
    answers: { 200: 'timeline' },
    handler: (call) => getTimeline(call, call.params.applicationId),
  }),
];
