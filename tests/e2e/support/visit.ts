import { expect } from "@playwright/test";
import type { Page } from "@playwright/test";

/** Hands on a phone: every tap is counted, and a typed digit is one tap. */
export class Hands {
  taps = 0;
  readonly page: Page;
  constructor(page: Page) {
    this.page = page;
  }

  /** Taps a button by its words. */
  async tap(name: string | RegExp, options: { exact?: boolean } = {}): Promise<void> {
    this.taps += 1;
    await this.page
      .getByRole("button", { name, exact: options.exact ?? false })
      .first()
      .click();
  }

  /** Types digits into the field with the focus, or the first one. */
  async type(text: string, label?: string | RegExp): Promise<void> {
    this.taps += text.length;
    const field = label ? this.page.getByLabel(label).first() : this.page.locator("main input").first();
    await field.fill(text);
  }

  /** Waits for a screen of the walk. */
  async at(screen: string): Promise<void> {
    await expect(this.page).toHaveURL(new RegExp(`/${screen}(\\?|$)`));
  }

  /** Opens the call and starts at the door. */
  async start(callId: string): Promise<void> {
    await this.page.goto(`/calls/${callId}`);
    await this.tap("Start at the door");
    await this.at("door");
  }

  /** The door when all is well, and the unit: four taps. */
  async allWell(): Promise<void> {
    await this.tap("No. CO 0 ppm");
    await this.tap("None. 0 % LEL");
    await this.tap("Yes", { exact: true });
    await this.at("confirm");
    await this.tap("Both are right");
    await this.at("look");
  }

  /** What is asked of every unit left in service, after the lights: flame and end, room CO, thermostat. */
  async alwaysAsked(): Promise<void> {
    await this.tap(/Steady, same with the blower/);
    await this.tap("CO 0 ppm", { exact: true });
    await this.tap(/customer's setting/);
  }

  /** Closes as fixed and sends the report: two taps. */
  async closeAndReport(): Promise<void> {
    await this.at("answers");
    await this.tap("Close as fixed");
    await this.at("done");
    await this.tap(/Send the report/);
    await expect(this.page.getByText(/The report goes to/)).toBeVisible();
  }
}
