import type { Locator, Page } from 'playwright-core';
import { expect } from 'vitest';
import { DEMO_PASSWORD } from '#server/services/accounts/demo-accounts';
import { axeFaults, openBrowser } from './browser';
import type { Visitor } from './browser';

/** Somebody at the product: goes to pages, presses what they read, and looks at each page with axe. */
export class Person {
  private constructor(
    private readonly visitor: Visitor,
    private readonly base: string,
  ) {}

  static async signIn(
    base: string,
    email: string,
    size?: { width: number; height: number },
  ): Promise<Person> {
    const person = new Person(await openBrowser(size), base);
    await person.page.goto(`${base}/sign-in`);
    await person.page.getByLabel('Email').fill(email);
    await person.page.getByLabel('Password').fill(DEMO_PASSWORD);
    await person.isAccessible();
    await person.press('Sign in');
    await person.page.waitForURL((url) => url.pathname !== '/sign-in');
    return person;
  }

  get page(): Page {
    return this.visitor.page;
  }

  /** Opens a page and waits until it shows its heading. */
  async goTo(path: string): Promise<void> {
    await this.page.goto(this.base + path);
    await this.page.getByRole('heading', { level: 1 }).waitFor();
    await this.page.waitForLoadState('networkidle');
  }

  press(name: string | RegExp, scope: Page | Locator = this.page): Promise<void> {
    return scope
      .getByRole('button', { name, exact: typeof name === 'string' })
      .first()
      .click();
  }

  /** Confirms the dialog that stands open; it goes once the server has answered. */
  async confirm(name: string | RegExp): Promise<void> {
    const dialog = this.page.getByRole('dialog');
    await this.isAccessible();
    await this.press(name, dialog);
    await dialog.waitFor({ state: 'hidden' });
  }

  fill(label: string, text: string): Promise<void> {
    return this.page.getByLabel(label, { exact: true }).fill(text);
  }

  choose(label: string, option: string): Promise<string[]> {
    return this.page.getByLabel(label, { exact: true }).selectOption(option);
  }

  /** Waits until the words stand on the page for the eye; what only paper shows does not count. */
  async sees(text: string | RegExp): Promise<void> {
    await this.page.getByText(text).filter({ visible: true }).first().waitFor();
  }

  async isAccessible(): Promise<void> {
    expect(await axeFaults(this.page)).toEqual([]);
  }

  /** Ends the visit; a script error or a broken content policy on any page fails the test. */
  async leave(): Promise<void> {
    const complaints = [...this.visitor.complaints];
    await this.visitor.close();
    expect(complaints).toEqual([]);
  }
}
