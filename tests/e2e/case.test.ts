import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Person } from './support/person';
import { startProduct } from '../support/running-product';
import type { RunningProduct } from '../support/running-product';

const APPLICANT = 'sandgate@fellgate.example';
const REVIEWER = 'thornholt@northmoor.example';

let product: RunningProduct;
let number: string;

beforeAll(async () => {
  product = await startProduct({ DEMO: 'on' });
});
afterAll(() => product?.stop());

/** The line of the filing format's example, with X1 stated per mile: an invented line. */
async function fillLine(person: Person): Promise<void> {
  await person.fill('Name', 'Harrow Fell – Sarn');
  await person.fill('From', 'Harrow Fell');
  await person.fill('To', 'Sarn');
  await person.fill('Nominal voltage', '345');
  const declared = { R1: '0.0402', X1: '0.6135', B1: '4.347', R0: '0.334', X0: '1.271', B0: '2.83' };
  for (const [label, value] of Object.entries(declared)) await person.fill(label, value);
  await person.fill('Length', '42.5');
  await person.choose('Fill from a structure', 'Flat');
  await person.choose('Ground wires', '2');
  for (const [phase, x] of [
    ['a', -9],
    ['b', 0],
    ['c', 9],
  ] as const) {
    await person.fill(`Phase ${phase}, across, metres`, String(x));
    await person.fill(`Phase ${phase}, height, metres`, '24');
    await person.fill(`Phase ${phase}, sag, metres`, '9');
  }
  for (const [wire, x] of [
    [1, -6.5],
    [2, 6.5],
  ] as const) {
    await person.fill(`Ground wire ${wire}, across, metres`, String(x));
    await person.fill(`Ground wire ${wire}, height, metres`, '30');
    await person.fill(`Ground wire ${wire}, sag, metres`, '7');
  }
  await person.choose('Phase conductor', 'Drake');
  await person.choose('Ground wire', '3/8 in EHS 7-strand steel');
  await person.choose('Subconductors per phase', '2');
  await person.fill('Bundle spacing', '0.4572');
  await person.fill('Earth resistivity', '100');
}

describe('a case from draft to acceptance', () => {
  it('an applicant begins an application and enters a line beside the live check', async () => {
    const applicant = await Person.signIn(product.baseUrl, APPLICANT);
    await applicant.goTo('/applications');
    await applicant.isAccessible();
    await applicant.goTo('/applications/new');
    await applicant.isAccessible();
    await applicant.fill('Title', 'Harrow wind, 120 MW');
    await applicant.choose('Kind of connection', 'Generation');
    await applicant.page.getByLabel('Capacity').fill('120');
    await applicant.fill('Point of connection', 'Sarn');
    await applicant.press('Begin the application');
    await applicant.page.waitForURL(/\/applications\/\d\d-\d{4}$/);
    number = new URL(applicant.page.url()).pathname.split('/').at(-1) ?? '';

    await applicant.goTo(`/applications/${number}/lines/L1`);
    await fillLine(applicant);
    await applicant.sees('X1 is 61 % above what the geometry gives.');
    await applicant.sees(/if the value is per mile/);
    await applicant.isAccessible();
    await applicant.press('Save line');
    await applicant.sees(/Saved at \d\d:\d\d/);
    await applicant.leave();
  });

  it('what was typed stands after a reload, and filing freezes revision A', async () => {
    const applicant = await Person.signIn(product.baseUrl, APPLICANT);
    await applicant.goTo(`/applications/${number}/lines/L1`);
    await applicant.page.getByLabel('X1', { exact: true }).waitFor();
    expect(await applicant.page.getByLabel('X1', { exact: true }).inputValue()).toBe('0.6135');
    await applicant.goTo(`/applications/${number}`);
    await applicant.isAccessible();
    await applicant.press('File revision A');
    await applicant.confirm('File revision A');
    await applicant.sees(/Revision A is filed/);
    await applicant.page.getByRole('link', { name: /What was found in Harrow Fell – Sarn: X1/ }).click();
    await applicant.sees('X1 is 61 % above what the geometry gives.');
    await applicant.isAccessible();
    await applicant.leave();
  });

  it('a reviewer takes it from the queue, raises a discrepancy and returns it', async () => {
    const reviewer = await Person.signIn(product.baseUrl, REVIEWER);
    await reviewer.goTo('/queue');
    await reviewer.isAccessible();
    await reviewer.press(new RegExp(`Take ${number}`));
    await reviewer.page.waitForURL(new RegExp(`/applications/${number}/review`));
    await reviewer.goTo(`/applications/${number}/review`);
    await reviewer.sees(/Accept opens once X1 of L1 is settled or waived/);
    await reviewer.isAccessible();
    await reviewer.press('Raise as D-1');
    await reviewer.confirm('Raise D-1');
    await reviewer.press('Return with 1 discrepancy');
    await reviewer.confirm('Return and send the letter');
    await reviewer.sees(/The applicant has the letter/);
    await reviewer.leave();
  });

  it('the applicant puts the proposed value in, answers and files revision B', async () => {
    const applicant = await Person.signIn(product.baseUrl, APPLICANT);
    await applicant.goTo(`/applications/${number}`);
    await applicant.sees(/File opens once D-1 is answered/);
    await applicant.isAccessible();
    await applicant.page.getByRole('link', { name: /^Put 0\.38\d+ Ω\/km into X1/ }).click();
    await applicant.press('Keep');
    await applicant.press('Save line');
    await applicant.sees(/Saved at \d\d:\d\d/);
    await applicant.goTo(`/applications/${number}`);
    await applicant.page.getByLabel('I changed the data').check();
    await applicant.fill('Your answer to D-1', 'Our table was per mile; X1 is corrected.');
    await applicant.press('Answer D-1');
    await applicant.press('File revision B');
    await applicant.confirm('File revision B');
    await applicant.sees(/revision B/i);
    await applicant.leave();
  });

  it('the reviewer settles the discrepancy and accepts; the record shows each step', async () => {
    const reviewer = await Person.signIn(product.baseUrl, REVIEWER);
    await reviewer.goTo(`/applications/${number}/review`);
    await reviewer.sees('Our table was per mile; X1 is corrected.');
    await reviewer.press('Accept the answer');
    await reviewer.sees(/Every discrepancy is settled|D-1.*settled|settled/);
    await reviewer.press('Accept');
    await reviewer.page
      .getByRole('dialog')
      .getByText(/replaces no engineering study/)
      .waitFor();
    await reviewer.confirm(/^Accept/);
    await reviewer.sees('Accepted');
    await reviewer.goTo(`/applications/${number}/record`);
    await reviewer.isAccessible();
    for (const step of [/filed/i, /took|taken/i, /returned/i, /accepted/i]) await reviewer.sees(step);
    await reviewer.leave();
  });
});
