import { ComponentHarness } from '@angular/cdk/testing';

/** Drives `sw-choice` as a person would. */
export class ChoiceHarness extends ComponentHarness {
  static readonly hostSelector = 'sw-choice';

  private readonly fields = this.locatorForAll('label');

  /** The labels of all options, in order. */
  async labels(): Promise<string[]> {
    return Promise.all((await this.locatorForAll('.label')()).map((label) => label.text()));
  }

  /** What stands under an option's label: its price difference, note or the reason against it. */
  async noteOf(label: string): Promise<string> {
    return (await this.find(label)).text().then((text) => text.slice(label.length).trim());
  }

  /** The label of what is chosen; null when nothing is. */
  async chosen(): Promise<string | null> {
    const radios = await this.locatorForAll('input')();
    const checked = await Promise.all(radios.map((radio) => radio.getProperty<boolean>('checked')));
    return (await this.labels())[checked.indexOf(true)] ?? null;
  }

  async canChoose(label: string): Promise<boolean> {
    return !(await (await this.radio(label)).getProperty<boolean>('disabled'));
  }

  async choose(label: string): Promise<void> {
    await (await this.radio(label)).click();
  }

  private async radio(label: string) {
    const at = (await this.labels()).indexOf(label);
    const radio = (await this.locatorForAll('input')())[at];
    if (radio === undefined) {
      throw new Error(`There is no option "${label}"`);
    }
    return radio;
  }

  private async find(label: string) {
    const field = (await this.fields())[(await this.labels()).indexOf(label)];
    if (field === undefined) {
      throw new Error(`There is no option "${label}"`);
    }
    return field;
  }
}
