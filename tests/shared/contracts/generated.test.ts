import { spawnSync } from 'node:child_process';
import { describe, expect, it } from 'vitest';
import { validatorOf } from '#shared/contracts/validators-by-name';
import { filingValidator } from '#shared/contracts/validators';

describe('what is made from something else', () => {
  it('is what its sources give: types, unit factors, list of columns', { timeout: 90_000 }, () => {
    const run = spawnSync(process.execPath, ['server/scripts/generate.mjs', '--check'], { encoding: 'utf8' });
    expect(run.stderr).toBe('');
    expect(run.status).toBe(0);
  });

  it('has a validator for the filing and for each request, response and file', () => {
    expect(filingValidator({ lines: [] })).toBe(false);
    expect(validatorOf('requests/saveDraftLine')({ line: {} })).toBe(true);
    expect(validatorOf('requests/saveDraftLine')({ line: {}, surplus: 1 })).toBe(false);
    expect(validatorOf('files/lines-csv')({ name: 'A' })).toBe(false);
  });
});
