import type { Page } from 'playwright-core';

/** Everyone of the demonstration has the same one. */
const demoPassword = 'ring-of-staves';

export class SignInPage {
  constructor(private readonly page: Page) {}

  /** Opens it and waits until it can be typed into. */
  async open(): Promise<void> {
    await this.page.goto('/sign-in');
    await this.email().waitFor();
  }

  email() {
    return this.page.getByRole('textbox', { name: 'E-mail address' });
  }

  password() {
    return this.page.getByLabel(/^Password/);
  }

  /** Types and sends, whatever comes of it. */
  async submit(email: string, password: string): Promise<void> {
    await this.email().fill(email);
    await this.password().fill(password);
    await this.page.getByRole('button', { name: 'Sign in' }).click();
  }

  /** Signs a person of the demonstration in and waits for the page behind. */
  async signIn(email: string): Promise<void> {
    await this.open();
    await this.submit(email, demoPassword);
    await this.page.waitForURL((url) => url.pathname !== '/sign-in');
  }
}
