import { ComponentHarness } from '@angular/cdk/testing';

/** Asks `sw-why` and reads its answer, which is drawn outside of it. */
export class WhyHarness extends ComponentHarness {
  static readonly hostSelector = 'sw-why';

  private readonly outside = this.documentRootLocatorFactory();

  async ask(): Promise<void> {
    await (await this.locatorFor('.ask')()).click();
  }

  /** Each part as "label value"; empty while nothing is open. */
  async parts(): Promise<readonly { label: string; value: string }[]> {
    const labels = await this.outside.locatorForAll('.panel dt')();
    const values = await this.outside.locatorForAll('.panel dd')();
    return Promise.all(
      labels.map(async (label, index) => ({ label: await label.text(), value: (await values[index]?.text()) ?? '' })),
    );
  }

  async close(): Promise<void> {
    await (await this.outside.locatorFor('.panel .close')()).click();
  }
}
