export { SearchField, useAddressPart } from './address-search';
export { ChoiceField, knownOrNull, UNKNOWN } from './choice-field';
export { DateField, dateText, readDate } from './date-field';
export { FieldRow } from './field-row';
export { FormFold } from './form-fold';
export { LinkRow } from './link-row';
export { LoadProblem, MorePages } from './more-pages';
export { Facts, keyPart, NOT_GIVEN, rowParts, type Part } from './parts';
export { RecordForm, type RecordValues } from './record-form';
export { dayWords, shopDay, whenWords } from './shop-time';
export {
  collectTexts,
  EMPTY_ENTRY,
  EntryField,
  entryInUnits,
  entryRules,
  mapEntries,
  recallTexts,
  storedEntry,
  typedEntry,
  type Entries,
  type EntryChange,
  type TypedEntry,
} from './typed-entry';
export {
  EMPTY_LIST,
  ListField,
  listInUnits,
  listRule,
  listWords,
  storedList,
  type ListSpec,
  type TypedList,
} from './typed-list';
