import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Problem } from '#shared/contracts/errors';
import type * as Api from '#shared/contracts/api.generated';
import { aCaseInReview, aLine, expecting, PER_MILE, step } from '../../support/case';
import { makeTestApp, type Client, type TestApp } from '../../support/test-app';

let app: TestApp;
let applicant: Client;
let rival: Client;
let reviewer: Client;
let number: string;
const at = (path = '') => `/api/applications/${number}${path}`;

beforeAll(async () => {
  app = await makeTestApp();
  applicant = await app.signInAs('applicant');
  rival = await app.signInAs('applicant');
  reviewer = await app.signInAs('reviewer');
});
afterAll(() => app.close());

const PDF = Buffer.from('%PDF-1.7\n% a sheet of the tower\n');
const PNG = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 1, 2, 3]);
const JPEG = Buffer.from([0xff, 0xd8, 0xff, 0xe0, 1, 2, 3]);

function attach(
  client: Client,
  bytes: Buffer,
  filename: string,
  contentType: string,
  fields: Record<string, string> = {},
) {
  const request = client.agent.post(at('/attachments')).set('X-CSRF-Token', client.csrfToken);
  for (const [name, value] of Object.entries(fields)) void request.field(name, value);
  return request.attach('file', bytes, { filename, contentType });
}

describe('attachments', () => {
  beforeAll(async () => {
    number = await aCaseInReview(app, applicant, reviewer, [aLine('Sarn tie', { x1Factor: PER_MILE })]);
  });

  it('are kept with their hash and come back byte for byte, as a file and not as a page', async () => {
    const kept = await expecting<Api.Attachment>(
      201,
      attach(applicant, PDF, 'tower sheet.pdf', 'application/pdf'),
    );
    expect(kept).toMatchObject({
      fileName: 'tower sheet.pdf',
      mediaType: 'application/pdf',
      byteLength: PDF.length,
      sha256: createHash('sha256').update(PDF).digest('hex'),
      subject: { kind: 'application' },
    });
    const answer = await reviewer.get(kept.href).buffer(true);
    expect(answer.body as Buffer).toEqual(PDF);
    expect(answer.headers['content-disposition']).toMatch(/^attachment; filename="tower sheet\.pdf"/);
    expect(answer.headers['x-content-type-options']).toBe('nosniff');
    expect(answer.headers['content-security-policy']).toContain('sandbox');
    expect((await rival.get(kept.href)).status).toBe(404);
  });

  it('hang on a line or a discrepancy, and on nothing else', async () => {
    const onLine = await expecting<Api.Attachment>(
      201,
      attach(reviewer, PNG, 'a.png', 'image/png', { subject: 'line', ref: 'L1' }),
    );
    expect(onLine.subject).toEqual({ kind: 'line', lineKey: 'L1', discrepancy: null });
    const raise = { revision: 'A', title: 'X1', question: 'Why?' };
    await expecting(201, reviewer.post(at('/discrepancies'), raise));
    const subject = { subject: 'discrepancy', ref: '1' };
    const onD = await expecting<Api.Attachment>(201, attach(reviewer, JPEG, 'b.JPG', 'image/jpeg', subject));
    expect(onD.subject).toEqual({ kind: 'discrepancy', lineKey: null, discrepancy: 1 });
    // the applicant knows of D-1 only once it is sent
    expect((await applicant.get(onD.href)).status).toBe(404);
    await expecting<Problem>(422, attach(applicant, JPEG, 'b.jpg', 'image/jpeg', subject));
    await step(reviewer, number, 'return', { revision: 'A' });
    expect((await applicant.get(onD.href)).status).toBe(200);
    const { items } = await expecting<Api.DiscrepancyList>(200, applicant.get(at('/discrepancies')));
    expect(items[0]?.attachments.map((a) => a.fileName)).toEqual(['b.JPG']);
    for (const fields of [
      { subject: 'line', ref: 'L9' },
      { subject: 'discrepancy', ref: '7' },
      { subject: 'user' },
    ]) {
      expect(
        (await attach(applicant, PNG, 'a.png', 'image/png', fields as Record<string, string>)).status,
      ).toBe(422);
    }
  });

  it.each([
    ['a page under another name', Buffer.from('<html><script>1</script>'), 'a.pdf', 'application/pdf', 415],
    ['a picture declared as PDF', PNG, 'a.pdf', 'application/pdf', 415],
    ['a PDF with the ending of a picture', PDF, 'a.png', 'application/pdf', 415],
    ['a page', Buffer.from('<html>'), 'a.html', 'text/html', 415],
    ['a drawing', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'), 'a.svg', 'image/svg+xml', 415],
    ['nothing', Buffer.alloc(0), 'a.pdf', 'application/pdf', 422],
    [
      'what the scan refuses',
      Buffer.concat([
        PDF,
        Buffer.from('X5O!P%@AP[4\\PZX54(P^)7CC)7}$EICAR-STANDARD-ANTIVIRUS-TEST-FILE!$H+H*'),
      ]),
      'a.pdf',
      'application/pdf',
      422,
    ],
    ['more than 20 MB', Buffer.concat([PDF, Buffer.alloc(20_000_000)]), 'a.pdf', 'application/pdf', 413],
  ])('refuse %s', async (_, bytes, name, type, status) => {
    expect((await attach(applicant, bytes, name, type)).status).toBe(status);
  });

  it('take their own name and nothing of a path', async () => {
    const kept = await expecting<Api.Attachment>(
      201,
      attach(applicant, PDF, '../../etc/\u202Efdp.pdf', 'application/pdf'),
    );
    expect(kept.fileName).toBe('fdp.pdf');
  });
});
