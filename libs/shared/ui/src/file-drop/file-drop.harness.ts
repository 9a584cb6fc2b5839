import { ComponentHarness } from '@angular/cdk/testing';

/** Reads `sw-file-drop` as a person would. Giving it a file needs the environment's own means. */
export class FileDropHarness extends ComponentHarness {
  static readonly hostSelector = 'sw-file-drop';

  /** What stands against the file; empty when nothing does. */
  async problem(): Promise<string> {
    return (await this.locatorFor('.problem')()).text();
  }

  /** Whether a file is on its way. */
  async isBusy(): Promise<boolean> {
    return (await this.locatorForOptional('progress')()) !== null;
  }
}
