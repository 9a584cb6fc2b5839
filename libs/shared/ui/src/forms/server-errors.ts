import { type AbstractControl, FormArray, FormGroup } from '@angular/forms';
import type { FieldProblem } from '../states/problem-text';

/**
 * Puts what the server said of fields at the controls that its JSON pointers name ("/lines/0/count"), as error
 * `server`, which goes when the value is changed. Returns what no control answers to, for the head of the form.
 */
export function showServerErrors(form: AbstractControl, problems: readonly FieldProblem[]): readonly FieldProblem[] {
  const homeless: FieldProblem[] = [];
  for (const problem of problems) {
    const control = controlAt(form, problem.pointer);
    if (control === undefined || control instanceof FormGroup || control instanceof FormArray) {
      homeless.push(problem);
    } else {
      control.setErrors({ ...control.errors, server: problem.message });
      control.markAsTouched();
    }
  }
  return homeless;
}

function controlAt(form: AbstractControl, pointer: string): AbstractControl | undefined {
  let control: AbstractControl | undefined = form;
  for (const part of pointer.split('/').slice(1)) {
    const name = part.replaceAll('~1', '/').replaceAll('~0', '~');
    if (control instanceof FormGroup) {
      control = Object.hasOwn(control.controls, name) ? control.controls[name] : undefined;
    } else if (control instanceof FormArray) {
      control = control.controls[Number(name)];
    } else {
      return undefined;
    }
  }
  return control;
}
