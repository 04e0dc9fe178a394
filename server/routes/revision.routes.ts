import { adoptRun, checkAgain } from '../services/review/check-again';
import { compareRevisions, compareRuns } from '../services/reads/compare';
import { getRevision, getRevisionLine, listRevisions } from '../services/reads/get-revision';
import { getRun, listRuns } from '../services/reads/list-runs';
import { listLines } from '../services/reads/list-lines';
import { route } from './route';

/** What was filed, and what the checks found. */
export const revisionRoutes = [
  route('listRevisions', {
    summary: 'Revisions of an application',
    access: { can: 'read', on: 'Revision' },
    answers: { 200: 'revision-list' },
    handler: (call) => listRevisions(call, call.params.applicationId),
  }),
  route('compareRevisions', {
    summary: 'Two revisions compared, field by field',
    access: { can: 'read', on: 'Revision' },
    answers: { 200: 'revision-comparison' },
    handler: (call) => compareRevisions(call, call.params.applicationId, call.query),
  }),
  route('getRevision', {
    summary: 'A revision with its lines, findings and check runs',
    access: { can: 'read', on: 'Revision' },
    answers: { 200: 'revision' },
    handler: (call) => getRevision(call, call.params.applicationId, call.params.letter),
  }),
  route('getRevisionLine', {
    summary: 'A line of a revision with its balance rows, findings and geometry',
    access: { can: 'read', on: 'Revision' },
    answers: { 200: 'revision-line' },
    handler: (call) => {
      const { applicationId, letter, lineKey } = call.params;
      return getRevisionLine(call, applicationId, letter, lineKey);
    },
  }),
  route('listRuns', {
    summary: 'Check runs of a revision',
    access: { can: 'read', on: 'Revision' },
    answers: { 200: 'run-list' },
    handler: (call) => listRuns(call, call.params.applicationId, call.params.letter),
  }),
  route('checkAgain', {
    summary: 'Check a revision again, under the rules in force now',
    access: { can: 'review', on: 'Revision' },
    answers: { 202: 'run' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, letter } = call.params;
      return getRun(call, applicationId, letter, await checkAgain(call, applicationId, letter));
    },
  }),
  route('adoptRun', {
    summary: 'Make a later run govern the current revision',
    access: { can: 'review', on: 'Revision' },
    answers: { 200: 'run' },
    idempotent: true,
    handler: async (call) => {
      const { applicationId, letter, run } = call.params;
      await adoptRun(call, applicationId, letter, Number(run), call.body);
      return getRun(call, applicationId, letter, Number(run));
    },
  }),
  route('compareRuns', {
    summary: 'Two check runs of a revision compared',
    access: { can: 'read', on: 'Revision' },
    answers: { 200: 'run-comparison' },
    handler: (call) => compareRuns(call, call.params.applicationId, call.params.letter, call.query),
  }),
  route('listLines', {
    summary: 'Lines of the latest revisions, a page',
    access: { can: 'read', on: 'Application' },
    answers: { 200: 'line-list' },
    handler: (call) => listLines(call, call.query),
  }),
];
