import { describe, expect, it } from 'vitest';
import { defineAbility } from '#shared/policies/ability';
import type { Action, Actor, Subject } from '#shared/policies/subjects';

const actor = (role: Actor['role'], orgId: string, barredOrgIds: string[] = []): Actor => ({
  userId: `${role}-1`,
  role,
  orgId,
  barredOrgIds,
});
const applicant = defineAbility(actor('applicant', 'fellgate'));
const reviewer = defineAbility(actor('reviewer', 'northmoor'));
const barred = defineAbility(actor('reviewer', 'northmoor', ['fellgate']));
const administrator = defineAbility(actor('administrator', 'northmoor'));
const nobody = defineAbility(null);

const application = (orgId: string, firstFiledAt: string | null = '2027-02-09T10:00:00Z') => ({
  kind: 'Application' as const,
  orgId,
  firstFiledAt,
});

const SUBJECTS: Subject[] = [
  'Application',
  'Draft',
  'Revision',
  'Discrepancy',
  'Attachment',
  'Letter',
  'Countersign',
  'Import',
  'Note',
  'RuleSet',
  'Conductor',
  'Calendar',
  'Organisation',
  'User',
  'Membership',
  'Invitation',
  'AuditEvent',
];
const ACTIONS: Action[] = [
  'read',
  'create',
  'update',
  'file',
  'answer',
  'withdraw',
  'amend',
  'review',
  'decide',
  'countersign',
  'publish',
  'administer',
];

describe('nobody', () => {
  it('may do nothing', () => {
    for (const subject of SUBJECTS)
      for (const action of ACTIONS) expect(nobody.can(action, subject)).toBe(false);
  });
});

describe('an applicant', () => {
  it('has the own organisation’s applications, filed or not', () => {
    for (const action of ['read', 'update', 'file', 'answer', 'withdraw', 'amend'] as const) {
      expect(applicant.can(action, application('fellgate', null))).toBe(true);
      expect(applicant.can(action, application('skerrow'))).toBe(false);
    }
  });
  it('sees nothing of another organisation', () => {
    for (const kind of [
      'Application',
      'Draft',
      'Revision',
      'Discrepancy',
      'Attachment',
      'Letter',
      'Import',
    ] as const) {
      expect(applicant.can('read', { kind, orgId: 'fellgate' })).toBe(true);
      expect(applicant.can('read', { kind, orgId: 'skerrow' })).toBe(false);
      expect(applicant.can('read', { kind })).toBe(false);
    }
  });
  it('neither reviews nor decides, not even the own', () => {
    expect(applicant.can('review', application('fellgate'))).toBe(false);
    expect(applicant.can('decide', application('fellgate'))).toBe(false);
    expect(applicant.can('review', { kind: 'Discrepancy', orgId: 'fellgate' })).toBe(false);
  });
  it('sees none of what reviewers have among themselves', () => {
    for (const kind of ['Countersign', 'Note', 'AuditEvent', 'Invitation'] as const) {
      expect(applicant.can('read', kind)).toBe(false);
    }
  });
  it('reads the rules, and changes none', () => {
    expect(applicant.can('read', 'RuleSet')).toBe(true);
    expect(applicant.can('read', 'Conductor')).toBe(true);
    expect(applicant.can('update', 'RuleSet')).toBe(false);
    expect(applicant.can('publish', 'RuleSet')).toBe(false);
  });
});

describe('a reviewer', () => {
  it('has what was ever filed, and no drafts', () => {
    for (const action of ['read', 'review', 'decide'] as const) {
      expect(reviewer.can(action, application('fellgate'))).toBe(true);
      expect(reviewer.can(action, application('fellgate', null))).toBe(false);
    }
    expect(reviewer.can('read', { kind: 'Draft', orgId: 'fellgate' })).toBe(false);
    expect(reviewer.can('read', { kind: 'Import', orgId: 'fellgate' })).toBe(false);
  });
  it('sees nothing of an organisation that he or she is barred from', () => {
    for (const action of ['read', 'review', 'decide'] as const) {
      expect(barred.can(action, application('fellgate'))).toBe(false);
      expect(barred.can(action, application('skerrow'))).toBe(true);
    }
    for (const kind of ['Revision', 'Discrepancy', 'Attachment', 'Letter', 'Countersign', 'Note'] as const) {
      expect(barred.can('read', { kind, orgId: 'fellgate' })).toBe(false);
      expect(barred.can('read', { kind, orgId: 'skerrow' })).toBe(true);
    }
  });
  it('files and answers nothing', () => {
    for (const action of ['create', 'update', 'file', 'answer', 'withdraw', 'amend'] as const) {
      expect(reviewer.can(action, application('fellgate'))).toBe(false);
    }
  });
  it('countersigns only what another proposed', () => {
    expect(
      reviewer.can('countersign', { kind: 'Countersign', orgId: 'fellgate', proposedBy: 'reviewer-2' }),
    ).toBe(true);
    expect(
      reviewer.can('countersign', { kind: 'Countersign', orgId: 'fellgate', proposedBy: 'reviewer-1' }),
    ).toBe(false);
    expect(
      barred.can('countersign', { kind: 'Countersign', orgId: 'fellgate', proposedBy: 'reviewer-2' }),
    ).toBe(false);
  });
  it('administers nothing', () => {
    for (const kind of ['User', 'Organisation', 'Membership', 'Invitation'] as const) {
      expect(reviewer.can('administer', kind)).toBe(false);
    }
    expect(reviewer.can('read', 'AuditEvent')).toBe(false);
  });
});

describe('an administrator', () => {
  it('reads what was filed and decides no case', () => {
    expect(administrator.can('read', application('fellgate'))).toBe(true);
    expect(administrator.can('read', application('fellgate', null))).toBe(false);
    for (const action of ['review', 'decide', 'file', 'update', 'withdraw'] as const) {
      expect(administrator.can(action, application('fellgate'))).toBe(false);
    }
    expect(administrator.can('countersign', 'Countersign')).toBe(false);
  });
  it('sets the rules and reads the trail', () => {
    expect(administrator.can('publish', 'RuleSet')).toBe(true);
    expect(administrator.can('update', 'Calendar')).toBe(true);
    expect(administrator.can('read', 'AuditEvent')).toBe(true);
  });
  it('grants nothing to himself or herself', () => {
    expect(administrator.can('administer', { kind: 'Membership', userId: 'somebody' })).toBe(true);
    expect(administrator.can('administer', { kind: 'Membership', userId: 'administrator-1' })).toBe(false);
  });
});
