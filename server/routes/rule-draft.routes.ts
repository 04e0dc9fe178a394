import { route } from './route';
import { presentRuleSet } from '../presenters/rule-set.presenter';
import { namesOf } from '../repositories/people-names.repository';
import { listRuleSets } from '../repositories/rule-parts.repository';
import { currentRuleSet } from '../repositories/rule-set.repository';
import { discardBandDraft, presentDraft, readBandDraft, saveBandDraft } from '../services/rules/band-draft';
import { publishBands } from '../services/rules/publish-bands';

/** Bands, tolerances, uncertainties and settings as an administrator changes them. */
export const ruleDraftRoutes = [
  route('listRuleSets', {
    summary: 'All versions of the rules',
    access: { can: 'publish', on: 'RuleSet' },
    answers: { 200: 'rule-set-list' },
    handler: async ({ tx: { manager } }) => {
      const sets = await listRuleSets(manager);
      const people = await namesOf(
        manager,
        sets.map((set) => set.publishedBy),
      );
      const { version } = await currentRuleSet(manager);
      return { items: sets.map((set) => presentRuleSet(set, people, version)) };
    },
  }),
  route('getBandDraft', {
    summary: 'The next rule set as it stands',
    access: { can: 'update', on: 'RuleSet' },
    answers: { 200: 'band-draft' },
    handler: async ({ tx }) => presentDraft(await readBandDraft(tx)),
  }),
  route('saveBandDraft', {
    summary: 'Save the next rule set; nothing is in force by it',
    access: { can: 'update', on: 'RuleSet' },
    answers: { 200: 'band-draft' },
    versioned: true,
    idempotent: true,
    handler: async ({ tx, actor, body }) => presentDraft(await saveBandDraft(tx, actor, body)),
  }),
  route('discardBandDraft', {
    summary: 'Throw the draft away',
    access: { can: 'update', on: 'RuleSet' },
    answers: { 200: 'band-draft' },
    versioned: true,
    handler: async ({ tx, query }) => presentDraft(await discardBandDraft(tx, Number(query.version))),
  }),
  route('publishBands', {
    summary: 'Put the draft in force, with a reason',
    access: { can: 'publish', on: 'RuleSet' },
    answers: { 200: 'rule-set-summary' },
    versioned: true,
    idempotent: true,
    handler: async ({ tx, actor, body }) => {
      const set = await publishBands(tx, actor, body);
      return presentRuleSet(set, await namesOf(tx.manager, [set.publishedBy]), set.version);
    },
  }),
];
