export { QuantityField, QuantityInput, TextField } from './formik-fields';
export { fieldErrorsOf, FormErrors, FormProblem } from './form-problems';
export { draftKey, readDraft, removeDraft, useLocalDraft, type LocalDraft } from './local-draft';
export { quantityHint, quantityText, readEntry, type QuantitySpec } from './quantity';
