import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Person } from './support/person';
import { startProduct } from '../support/running-product';
import type { RunningProduct } from '../support/running-product';
import { fileFolder } from './support/files';

const files = fileFolder();
let product: RunningProduct;

beforeAll(async () => {
  product = await startProduct({ DEMO: 'on' });
});
afterAll(async () => {
  files.remove();
  await product?.stop();
});

const COLUMNS =
  'name;from;to;nominal_voltage_kv;frequency_hz;section;length_km;earth_resistivity_ohm_m;conductor;' +
  'conductor_temperature_c;a_x_m;a_height_m;a_sag_m;b_x_m;b_height_m;b_sag_m;c_x_m;c_height_m;c_sag_m;' +
  'r1;x1;b1;impedance_unit;susceptance_unit';
/** One invented 230 kV line with half of its charging declared; `x1` as it stands in the cell. */
const row = (x1: string) =>
  `Tarn – Sarn;Tarn;Sarn;230;60;1;18,5;100;Drake;50;-6;20;6;0;20;6;6;20;6;0,0795;${x1};1,7;ohm/km;uS/km`;

async function chooseFile(person: Person, path: string): Promise<void> {
  const chosen = person.page.waitForEvent('filechooser');
  await person.press('Choose a file');
  await (await chosen).setFiles(path);
}

describe('a table of lines', () => {
  it('says row and column of a fault, keeps the draft, and takes the mended file', async () => {
    const applicant = await Person.signIn(product.baseUrl, 'holm@skerrow.example');
    await applicant.goTo('/applications/new');
    await applicant.fill('Title', 'Tarn storage');
    await applicant.choose('Kind of connection', 'Storage');
    await applicant.fill('Point of connection', 'Sarn');
    await applicant.press('Begin the application');
    await applicant.page.waitForURL(/\/applications\/\d\d-\d{4}$/);

    await chooseFile(applicant, files.write('tarn.csv', `${COLUMNS}\n${row('0,489 km')}\n`));
    await applicant.press('The place to look at');
    const fault = applicant.page.getByRole('dialog').getByRole('row', { name: /^2 x1 0,489 km/ });
    await fault.waitFor();
    await applicant.isAccessible();
    await applicant.page.keyboard.press('Escape');

    await applicant.page.reload();
    await chooseFile(applicant, files.write('tarn.csv', `${COLUMNS}\n${row('0,489')}\n`));
    await applicant.sees(/parted by semicolons, decimal comma/);
    await applicant.press('Take the line');
    await applicant.page.getByRole('link', { name: 'Tarn – Sarn' }).waitFor();
    await applicant.press('File revision A');
    await applicant.confirm('File revision A');
    await applicant.page.getByRole('link', { name: /What was found in Tarn – Sarn/ }).click();
    await applicant.sees(/one leg of the pi/);
    await applicant.isAccessible();
    await applicant.leave();
  });
});

describe('the bands', () => {
  it('an administrator moves a bound, publishes it with a reason, and the record keeps it', async () => {
    const administrator = await Person.signIn(product.baseUrl, 'moss@northmoor.example');
    await administrator.goTo('/bands');
    await administrator.isAccessible();
    await administrator.fill('X1, upper bound, Ω/km', '0.50');
    await administrator.press('Save the draft');
    await administrator.press('Publish rules 2');
    await administrator.page
      .getByRole('dialog')
      .getByRole('textbox')
      .first()
      .fill('Our 230 kV lines are compact.');
    await administrator.confirm('Publish rules 2');
    await administrator.sees(/Rules 2 since/);
    await administrator.goTo('/record');
    const entry = administrator.page.getByText('Our 230 kV lines are compact.').first();
    await entry.waitFor({ state: 'attached' });
    await administrator.isAccessible();
    for (const path of ['/people', '/rules', '/lines', '/letters']) {
      await administrator.goTo(path);
      await administrator.isAccessible();
    }
    await administrator.leave();
  });
});

describe('on a phone', () => {
  it('queue and review fold without a page that scrolls sideways', async () => {
    const reviewer = await Person.signIn(product.baseUrl, 'thornholt@northmoor.example', {
      width: 360,
      height: 740,
    });
    for (const path of ['/queue', '/applications', '/rules']) {
      await reviewer.goTo(path);
      await reviewer.isAccessible();
      const wider = await reviewer.page.evaluate(
        () => document.documentElement.scrollWidth - window.innerWidth,
      );
      expect(wider).toBeLessThanOrEqual(0);
    }
    await reviewer.leave();
  });
});

describe('a session that has ended', () => {
  it('asks to sign in again over the page, and what was typed stands', async () => {
    const applicant = await Person.signIn(product.baseUrl, 'garth@lintgarth.example');
    await applicant.goTo('/applications/new');
    await applicant.fill('Title', 'Words that must not be lost');
    await applicant.choose('Kind of connection', 'Load');
    await applicant.fill('Point of connection', 'Dunmere');
    await applicant.page.context().clearCookies();
    await applicant.press('Begin the application');
    const again = applicant.page.getByRole('dialog');
    await again.getByLabel('Password').fill('level beam on a pivot');
    await again.getByRole('button', { name: /Sign in/ }).click();
    await again.waitFor({ state: 'hidden' });
    const stands = applicant.page.getByLabel('Title', { exact: true });
    if (await stands.isVisible()) {
      expect(await stands.inputValue()).toBe('Words that must not be lost');
      await applicant.press('Begin the application');
    }
    await applicant.page.waitForURL(/\/applications\/\d\d-\d{4}$/);
    await applicant.page.getByRole('heading', { name: 'Words that must not be lost' }).waitFor();
    await applicant.leave();
  });
});
