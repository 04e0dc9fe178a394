import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { keepFocus } from '../../../src/hooks/use-kept-focus';

let stop: () => void;
const named = (id: string) => document.getElementById(id) as HTMLElement;
const settled = () => new Promise((resolve) => setTimeout(resolve, 160));

beforeEach(() => {
  document.body.innerHTML = `<main><h1>26-0418</h1><button id="file">File</button>
    <section><h2>Lines</h2><button id="remove">Remove</button><button id="stays">Add</button></section>
    <p id="words">Words</p></main>`;
  stop = keepFocus();
});
afterEach(() => {
  stop();
  document.body.innerHTML = '';
});

describe('the focus, when its control goes', () => {
  it('is led to the heading of its part of the page', async () => {
    named('remove').focus();
    named('remove').remove();
    await settled();
    expect(document.activeElement?.textContent).toBe('Lines');
  });

  it('is led to the heading of the page where its part is gone too', async () => {
    named('remove').focus();
    named('remove').parentElement?.remove();
    await settled();
    expect(document.activeElement?.textContent).toBe('26-0418');
  });

  it('goes back through a dialog to where the dialog was opened', async () => {
    named('remove').focus();
    document.body.insertAdjacentHTML(
      'beforeend',
      '<div role="dialog"><h2>Sure?</h2><button id="yes">Yes</button></div>',
    );
    named('yes').focus();
    named('remove').remove();
    document.querySelector('[role="dialog"]')?.remove();
    await settled();
    expect(document.activeElement?.textContent).toBe('Lines');
  });

  it('goes back to what opened a dialog, by a menu too', async () => {
    named('stays').focus();
    document.body.insertAdjacentHTML('beforeend', '<div role="menu"><button id="item">Roles</button></div>');
    named('item').focus();
    document.querySelector('[role="menu"]')?.remove();
    document.body.insertAdjacentHTML('beforeend', '<div role="dialog"><button id="yes">Yes</button></div>');
    named('yes').focus();
    document.querySelector('[role="dialog"]')?.remove();
    await settled();
    expect(document.activeElement).toBe(named('stays'));
  });

  it('is left alone where it stands, and where the reader put it aside', async () => {
    named('stays').focus();
    named('remove').remove();
    await settled();
    expect(document.activeElement).toBe(named('stays'));
    named('stays').blur();
    named('words').dispatchEvent(new Event('pointerdown', { bubbles: true }));
    named('stays').remove();
    await settled();
    expect(document.activeElement).toBe(document.body);
  });
});
