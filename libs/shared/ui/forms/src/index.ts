// What is typed, chosen or handed in stands apart from `shared/ui`, so that pages without it don't load Angular's forms.
export { Choice, type ChoiceOption } from '../../src/choice/choice';
export { ChoiceHarness } from '../../src/choice/choice.harness';
export { FieldError } from '../../src/forms/field-error';
export { FIELD_MESSAGES, type FieldMessages } from '../../src/forms/field-messages';
export { FileDrop, type FileLimits } from '../../src/file-drop/file-drop';
export { FileDropHarness } from '../../src/file-drop/file-drop.harness';
export { FormErrors } from '../../src/forms/form-errors';
export { QuantityField } from '../../src/quantity/quantity';
export { QuantityHarness } from '../../src/quantity/quantity.harness';
export { showServerErrors } from '../../src/forms/server-errors';
