import type { Locator, Page } from 'playwright-core';

/**
 * A hand that touches the screen and counts: each touch of the screen is a tap, and so are the two of a choice in a
 * list. Keys typed are counted apart. A part of the work is closed with `lap`.
 */
export class CountingHand {
  taps = 0;
  keys = 0;
  private readonly startMs = Date.now();
  private lapTaps = 0;
  private lapKeys = 0;
  private readonly laps: string[] = [];

  constructor(private readonly page: Page) {}

  async tap(target: Locator): Promise<void> {
    this.taps++;
    await target.tap();
  }

  button(name: string | RegExp): Promise<void> {
    return this.tap(this.page.getByRole('button', { name, exact: typeof name === 'string' }));
  }

  link(name: string): Promise<void> {
    return this.tap(this.page.getByRole('link', { name, exact: true }));
  }

  async type(label: string, text: string): Promise<void> {
    const field = this.page.getByLabel(label, { exact: true });
    await this.tap(field);
    this.keys += text.length;
    await field.fill(text);
  }

  async choose(label: string, option: string): Promise<void> {
    this.taps += 2;
    await this.page.getByLabel(label, { exact: true }).selectOption({ label: option });
  }

  lap(name: string): void {
    this.laps.push(`${name} ${this.taps - this.lapTaps} taps and ${this.keys - this.lapKeys} keys`);
    [this.lapTaps, this.lapKeys] = [this.taps, this.keys];
  }

  get account(): string {
    const seconds = Math.round((Date.now() - this.startMs) / 1000);
    return `${this.taps} taps and ${this.keys} keys, ${seconds} s by script: ${this.laps.join('; ')}`;
  }
}
