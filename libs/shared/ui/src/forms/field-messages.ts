import { InjectionToken } from '@angular/core';
import type { ValidationErrors } from '@angular/forms';

/** Puts a control's first error into words. An application may provide its own, from its message catalogue. */
export type FieldMessages = (errors: ValidationErrors) => string;

/** The words for Angular's own validators and for what the server said of a field. */
export const FIELD_MESSAGES = new InjectionToken<FieldMessages>('words for field errors', {
  providedIn: 'root',
  factory: () => wordsFor,
});

function wordsFor(errors: ValidationErrors): string {
  if (typeof errors['server'] === 'string') {
    return errors['server'];
  }
  if (typeof errors['message'] === 'string') {
    return errors['message'];
  }
  if (errors['required'] !== undefined) {
    return $localize`:@@ui.field.required:Please fill this in.`;
  }
  if (errors['email'] !== undefined) {
    return $localize`:@@ui.field.email:This is not an e-mail address.`;
  }
  if (errors['min'] !== undefined) {
    return $localize`:@@ui.field.min:It must be ${errors['min'].min}:least: or more.`;
  }
  if (errors['max'] !== undefined) {
    return $localize`:@@ui.field.max:It must be ${errors['max'].max}:most: or less.`;
  }
  if (errors['minlength'] !== undefined) {
    return $localize`:@@ui.field.minlength:It must have ${errors['minlength'].requiredLength}:least: characters or more.`;
  }
  if (errors['maxlength'] !== undefined) {
    return $localize`:@@ui.field.maxlength:It must have ${errors['maxlength'].requiredLength}:most: characters or fewer.`;
  }
  return $localize`:@@ui.field.invalid:This can't be used as it is.`;
}
