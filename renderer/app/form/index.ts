export { Field } from './Field';
export { NumberField } from './NumberField';
export { readNumber } from './readNumber';
export { ConfirmDialog } from './ConfirmDialog';
export { focusFirst } from './focusFirst';
