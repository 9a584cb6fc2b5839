import { ComponentHarness } from '@angular/cdk/testing';

/** Drives `sw-quantity` as a person would. */
export class QuantityHarness extends ComponentHarness {
  static readonly hostSelector = 'sw-quantity';

  private readonly field = this.locatorFor('input');
  private readonly buttons = this.locatorForAll('button');

  /** What stands in the field. */
  async text(): Promise<string> {
    return (await this.field()).getProperty<string>('value');
  }

  async isInvalid(): Promise<boolean> {
    return (await (await this.field()).getAttribute('aria-invalid')) === 'true';
  }

  /** Replaces what stands in the field and leaves it. */
  async type(text: string): Promise<void> {
    const field = await this.field();
    await field.setInputValue(text);
    await field.dispatchEvent('input');
    await field.blur();
  }

  async less(): Promise<void> {
    await (await this.buttons())[0]?.click();
  }

  async more(): Promise<void> {
    await (await this.buttons())[1]?.click();
  }
}
