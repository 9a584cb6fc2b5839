import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { TestBed } from '@angular/core/testing';
import { ChoiceHarness } from '@seamwright/shared/ui/forms';
import { aChoice, aValue } from '@seamwright/catalogue/domain/testing';
import type { ChosenValues } from '@seamwright/catalogue/domain';
import { SpecChoices, type ValueChosen } from './choices/spec-choices';

@Component({
  imports: [SpecChoices],
  template: `<sw-spec-choices [offer]="offer" [chosen]="chosen()" currency="GBP" (valueChosen)="choose($event)" />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly offer = {
    choices: [
      aChoice('trim', [aValue('6'), aValue('0', { priceChangeMinorPerKg: 280 })], 'mm fat'),
      aChoice('finish', [aValue('plain'), aValue('tied', { priceChangeMinorPerKg: 40 })]),
    ],
    choiceRules: [
      { when: { trim: '0' }, forbids: { choice: 'finish', value: 'tied' }, reason: 'nothing is left to tie' },
    ],
  };
  readonly chosen = signal<ChosenValues>({});
  choose({ choice, value }: ValueChosen): void {
    this.chosen.update((chosen) => ({ ...chosen, [choice]: value }));
  }
}

describe('the choices of a specification', () => {
  const open = async () => {
    const fixture = TestBed.createComponent(Host);
    const [trim, finish] = await TestbedHarnessEnvironment.loader(fixture).getAllHarnesses(ChoiceHarness);
    if (!trim || !finish) throw new Error('two choices are expected');
    return { trim, finish };
  };

  it('begin at the usual values, with what each other one costs', async () => {
    const { trim, finish } = await open();
    expect([await trim.chosen(), await finish.chosen()]).toEqual(['6', 'Plain']);
    expect(await trim.noteOf('0')).toBe('+ £2.80/kg');
    expect(await finish.noteOf('Plain')).toBe('as priced');
  });

  it('say why a value is impossible beside what is chosen, and free it again', async () => {
    const { trim, finish } = await open();
    await trim.choose('0');
    expect(await finish.canChoose('Tied')).toBe(false);
    expect(await finish.noteOf('Tied')).toBe('nothing is left to tie');
    await trim.choose('6');
    expect(await finish.canChoose('Tied')).toBe(true);
  });
});
