import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { FormArray, FormControl, FormGroup, Validators } from '@angular/forms';
import { FieldError } from './field-error';
import { FormErrors } from './form-errors';
import { showServerErrors } from './server-errors';

const orderForm = () =>
  new FormGroup({
    day: new FormControl(''),
    lines: new FormArray([new FormGroup({ count: new FormControl(1) }), new FormGroup({ count: new FormControl(0) })]),
  });

describe('showServerErrors', () => {
  it('puts each error at the field that its pointer names', () => {
    const form = orderForm();
    const homeless = showServerErrors(form, [{ pointer: '/lines/1/count', message: 'At least one piece.' }]);

    expect(form.get('lines.1.count')?.errors).toEqual({ server: 'At least one piece.' });
    expect(form.get('lines.1.count')?.touched).toBe(true);
    expect(form.get('lines.0.count')?.valid).toBe(true);
    expect(homeless).toEqual([]);
  });

  it('keeps what the field’s own rules say, and goes when the value changes', () => {
    const form = new FormGroup({ name: new FormControl('', Validators.required) });
    showServerErrors(form, [{ pointer: '/name', message: 'It is taken.' }]);
    expect(form.controls.name.errors).toEqual({ required: true, server: 'It is taken.' });

    form.controls.name.setValue('Harbour Kitchen');
    expect(form.controls.name.errors).toBeNull();
  });

  it.each(['', '/lines', '/lines/7/count', '/unknown', '/day/deeper', '/constructor'])(
    'hands back what belongs to no field: "%s"',
    (pointer) => {
      const form = orderForm();
      const problem = { pointer, message: 'No.' };

      expect(showServerErrors(form, [problem])).toEqual([problem]);
      expect(form.valid).toBe(true);
    },
  );
});

describe('FieldError', () => {
  async function drawn(control: FormControl) {
    const fixture = TestBed.createComponent(FieldError);
    fixture.componentRef.setInput('control', control);
    await fixture.whenStable();
    return { text: () => fixture.nativeElement.textContent.trim(), settle: () => fixture.whenStable() };
  }

  it('speaks once the field was left, and is still when it is mended', async () => {
    const control = new FormControl('', [Validators.required, Validators.minLength(3)]);
    const { text, settle } = await drawn(control);
    expect(text()).toBe('');

    control.markAsTouched();
    await settle();
    expect(text()).toBe('Please fill this in.');

    control.setValue('ab');
    await settle();
    expect(text()).toContain('3 characters');

    control.setValue('abc');
    await settle();
    expect(text()).toBe('');
  });

  it.each([
    [{ server: 'It is taken.', required: true }, 'It is taken.'],
    [{ message: 'After the cut-off.' }, 'After the cut-off.'],
    [{ email: true }, 'not an e-mail address'],
    [{ min: { min: 5 } }, '5 or more'],
    [{ max: { max: 9 } }, '9 or less'],
    [{ maxlength: { requiredLength: 8 } }, '8 characters or fewer'],
    [{ pattern: {} }, "can't be used"],
  ])('has words for %j', async (errors, words) => {
    const control = new FormControl('x');
    control.setErrors(errors);
    control.markAsTouched();
    const { text } = await drawn(control);

    expect(text()).toContain(words);
  });
});

@Component({
  imports: [FormErrors],
  template: `<sw-form-errors [problems]="problems" />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Host {
  readonly problems = [{ pointer: '', message: 'This customer is on hold.' }];
}

describe('FormErrors', () => {
  it('tells what belongs to no single field, at once', async () => {
    const fixture = TestBed.createComponent(Host);
    await fixture.whenStable();
    const alert: HTMLElement = fixture.nativeElement.querySelector('[role=alert]');

    expect(alert.textContent).toContain('on hold');
  });
});
