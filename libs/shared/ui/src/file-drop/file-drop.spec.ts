import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { FileDrop } from './file-drop';
import { FileDropHarness } from './file-drop.harness';

@Component({
  imports: [FileDrop],
  template: `
    <sw-file-drop
      label="Order sheet"
      [limits]="limits"
      [progress]="progress()"
      [error]="error()"
      (picked)="picked.push($event.name)"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly limits = { endings: ['.xlsx'], maxBytes: 5_000_000 };
  readonly progress = signal<number | null>(null);
  readonly error = signal('');
  readonly picked: string[] = [];
}

async function drawn() {
  const fixture = TestBed.createComponent(Host);
  const drop = await TestbedHarnessEnvironment.loader(fixture).getHarness(FileDropHarness);
  const dropFiles = async (...files: File[]): Promise<void> => {
    const event = Object.assign(new Event('drop', { cancelable: true }), { dataTransfer: { files } });
    fixture.nativeElement.querySelector('label').dispatchEvent(event);
    await fixture.whenStable();
  };
  return { drop, dropFiles, host: fixture.componentInstance };
}

const sheet = (name = 'orders.XLSX', bytes = 10): File => {
  const file = new File(['x'], name);
  Object.defineProperty(file, 'size', { value: bytes });
  return file;
};

describe('FileDrop', () => {
  it('hands on a file of the right kind', async () => {
    const { drop, dropFiles, host } = await drawn();
    await dropFiles(sheet());

    expect(host.picked).toEqual(['orders.XLSX']);
    expect(await drop.problem()).toBe('');
  });

  it.each([
    ['another ending', [sheet('orders.pdf')], 'ends in .xlsx'],
    ['too large', [sheet('orders.xlsx', 5_000_001)], 'larger than 5 MB'],
    ['empty', [sheet('orders.xlsx', 0)], 'empty'],
    ['several at once', [sheet(), sheet()], 'one file at a time'],
  ])('refuses what is %s, and says why', async (_, files, words) => {
    const { drop, dropFiles, host } = await drawn();
    await dropFiles(...files);

    expect(host.picked).toEqual([]);
    expect(await drop.problem()).toContain(words);
  });

  it('takes nothing while a file is on its way', async () => {
    const { drop, dropFiles, host } = await drawn();
    host.progress.set(40);
    expect(await drop.isBusy()).toBe(true);
    await dropFiles(sheet());

    expect(host.picked).toEqual([]);
  });

  it('says what the server has against it', async () => {
    const { drop, host } = await drawn();
    host.error.set('This is not a workbook.');

    expect(await drop.problem()).toBe('This is not a workbook.');
  });
});
