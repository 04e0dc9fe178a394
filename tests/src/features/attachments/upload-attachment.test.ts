import { describe, expect, it } from 'vitest';
import { fieldsOf } from '../../../../src/features/attachments/api/upload-attachment';

describe('a file that is sent', () => {
  it('says what it belongs to, in the fields that the server reads', () => {
    expect(fieldsOf({ discrepancy: 2 })).toEqual({ subject: 'discrepancy', ref: '2' });
    expect(fieldsOf({ lineKey: 'L1' })).toEqual({ subject: 'line', ref: 'L1' });
    expect(fieldsOf({})).toEqual({});
  });
});
