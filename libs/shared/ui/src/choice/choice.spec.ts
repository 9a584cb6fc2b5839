import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component, LOCALE_ID } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { Choice, type ChoiceOption } from './choice';
import { ChoiceHarness } from './choice.harness';

@Component({
  imports: [Choice, ReactiveFormsModule],
  template: `<sw-choice label="Finish" per="kg" [options]="options" [formControl]="finish" />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly finish = new FormControl('plain', { nonNullable: true });
  readonly options: ChoiceOption[] = [
    { value: 'plain', label: 'Plain', deltaMinor: 0 },
    { value: 'tied', label: 'Tied', deltaMinor: 40 },
    { value: 'open', label: 'Open', deltaMinor: -145 },
    { value: 'rolled', label: 'Rolled', deltaMinor: 90, refused: 'not for a steak' },
  ];
}

async function drawn() {
  TestBed.configureTestingModule({ providers: [{ provide: LOCALE_ID, useValue: 'en-GB' }] });
  const fixture = TestBed.createComponent(Host);
  const choice = await TestbedHarnessEnvironment.loader(fixture).getHarness(ChoiceHarness);
  return { choice, finish: fixture.componentInstance.finish };
}

describe('Choice', () => {
  it('shows what each value costs and why one can not be had', async () => {
    const { choice } = await drawn();

    expect(await Promise.all((await choice.labels()).map((label) => choice.noteOf(label)))).toEqual([
      'as priced',
      '+ £0.40/kg',
      '− £1.45/kg',
      'not for a steak',
    ]);
    expect(await choice.canChoose('Rolled')).toBe(false);
  });

  it('gives its form the chosen value and takes the form’s', async () => {
    const { choice, finish } = await drawn();
    expect(await choice.chosen()).toBe('Plain');

    await choice.choose('Tied');
    expect(finish.value).toBe('tied');

    finish.setValue('open');
    expect(await choice.chosen()).toBe('Open');
  });

  it('can be closed by its form', async () => {
    const { choice, finish } = await drawn();
    finish.disable();

    expect(await choice.canChoose('Tied')).toBe(false);
  });
});
