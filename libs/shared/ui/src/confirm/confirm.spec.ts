import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { Confirm } from './confirm';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Host {
  readonly confirm = inject(Confirm);
}

const question = {
  heading: 'Cancel order 1047?',
  text: 'Its lines leave the list.',
  act: 'Cancel the order',
  back: 'Keep it',
};

async function asked() {
  const fixture = TestBed.createComponent(Host);
  const answer = fixture.componentInstance.confirm.ask(question);
  const loader = TestbedHarnessEnvironment.documentRootLoader(fixture);
  while (document.querySelector('sw-confirm-dialog') === null) {
    await new Promise((resolve) => setTimeout(resolve));
  }
  return { answer, dialog: await loader.getHarness(MatDialogHarness) };
}

describe('Confirm', () => {
  it('asks with the deed as the button and answers yes when it is pressed', async () => {
    const { answer, dialog } = await asked();
    expect(await dialog.getTitleText()).toBe('Cancel order 1047?');
    expect(await dialog.getRole()).toBe('alertdialog');
    await (await dialog.getHarness(MatButtonHarness.with({ text: 'Cancel the order' }))).click();

    expect(await answer).toBe(true);
  });

  it('takes the way back and Escape for no', async () => {
    const first = await asked();
    await (await first.dialog.getHarness(MatButtonHarness.with({ text: 'Keep it' }))).click();
    expect(await first.answer).toBe(false);

    const second = await asked();
    await second.dialog.close();
    expect(await second.answer).toBe(false);
  });
});
