import { describe, expect, it } from 'vitest';
import type { BandDraft } from '#shared/contracts/api.generated';
import {
  changedSettings,
  readSetting,
  settingFaults,
  settingGroups,
  settingParts,
  settingText,
} from '../../../../src/features/bands/model/settings-form';

const DRAFT: BandDraft = {
  version: 3,
  ruleSetVersion: 2,
  bands: [],
  tolerances: { x1: { relative: 0.015, cap: 0.025 }, r0: { relative: 0.1, cap: 0.2 } },
  uncertainties: { heightM: 0.3, gmrRelative: 0.01, earthResistivityFactor: 3 },
  owner: { baseMva: 100, earthResistivityOhmM: 100 },
  windows: { 'take-up': 5, review: 20, cure: 10 },
};

const fields = settingGroups(DRAFT).flatMap((g) => g.fields);
const field = (place: string) => {
  const found = fields.find((f) => f.place === place);
  if (!found) throw new Error(`no field ${place}`);
  return found;
};

describe('figures beside the bands', () => {
  it('show shares as per cent', () => {
    expect(settingText(field('tolerances/x1/relative'))).toBe('1.5');
    expect(settingText(field('uncertainties/heightM'))).toBe('0.3');
    expect(readSetting('1.6', field('tolerances/x1/relative'))).toBe(0.016);
  });

  it('refuse what is no number above zero, and parts of days', () => {
    const bad = { 'tolerances/x1/cap': '0', 'windows/review': '2.5', 'owner/baseMva': 'many' };
    expect(Object.keys(settingFaults(settingGroups(DRAFT), bad)).sort()).toEqual(Object.keys(bad).sort());
    expect(settingFaults(settingGroups(DRAFT), { 'windows/review': '25' })).toEqual({});
  });

  it('send only the parts that were touched, each whole', () => {
    expect(settingParts(DRAFT, { 'tolerances/x1/cap': '3', 'windows/cure': '12' })).toEqual({
      tolerances: { x1: { relative: 0.015, cap: 0.03 }, r0: { relative: 0.1, cap: 0.2 } },
      windows: { 'take-up': 5, review: 20, cure: 12 },
    });
    expect(settingParts(DRAFT, {})).toEqual({});
    expect(DRAFT.tolerances['x1']).toEqual({ relative: 0.015, cap: 0.025 });
  });

  it('say what differs from the rules in force', () => {
    const inForce = new Map([
      ['tolerances/x1/relative', 0.015],
      ['tolerances/x1/cap', 0.02],
      ['owner/baseMva', 100],
    ]);
    const changes = changedSettings(settingGroups(DRAFT), { 'owner/baseMva': '200' }, inForce);
    expect(changes.map((c) => c.text)).toEqual([
      'X1, widened to at most: 2.5 %, now 2',
      'Base of per-unit values: 200 MVA, now 100',
    ]);
  });
});
