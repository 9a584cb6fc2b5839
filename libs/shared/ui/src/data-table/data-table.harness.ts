import { ComponentHarness } from '@angular/cdk/testing';

/** Reads and drives `sw-data-table` as a person would. */
export class DataTableHarness extends ComponentHarness {
  static readonly hostSelector = 'sw-data-table';

  /** The heads of the columns, in order. */
  async heads(): Promise<string[]> {
    return this.texts('th');
  }

  /** The texts of all rows, cell by cell; without head and totals. */
  async rows(): Promise<string[][]> {
    const width = (await this.heads()).length;
    const cells = await this.texts('tr.mat-mdc-row td');
    return Array.from({ length: Math.ceil(cells.length / (width || 1)) }, (_, row) =>
      cells.slice(row * width, (row + 1) * width),
    );
  }

  /** The texts of the totals row; empty when there is none. */
  async totals(): Promise<string[]> {
    return this.texts('tr.mat-mdc-footer-row td');
  }

  /** Presses a column's head. */
  async sortBy(label: string): Promise<void> {
    const button = await this.locatorForOptional(`th:nth-of-type(${(await this.heads()).indexOf(label) + 1}) button`)();
    if (button === null) {
      throw new Error(`The column "${label}" can't be sorted`);
    }
    await button.click();
  }

  private async texts(selector: string): Promise<string[]> {
    return Promise.all((await this.locatorForAll(selector)()).map((element) => element.text()));
  }
}
