import type { ValidatorFn } from '@angular/forms';
import { sayRefusal } from '@seamwright/shared/contracts';
import { checkPassword } from '@seamwright/identity/domain';

/** The rule for new passwords, as a field's validator; an empty field is left to `required`. */
export const newPassword =
  (email: () => string = () => ''): ValidatorFn =>
  ({ value }) => {
    if (typeof value !== 'string' || value === '') return null;
    const result = checkPassword(value, email());
    return result.ok ? null : { message: sayRefusal(result.refusal) };
  };
