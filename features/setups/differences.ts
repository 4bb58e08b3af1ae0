import { getIn } from 'formik';

import { QUANTITY_FIELDS, quantityField, type QuantityPath } from './fields';
import { textOf, type SetupValues } from './form';
import {
  HOLDING_WORDS,
  MATERIAL_WORDS,
  OPERATION_WORDS,
  PRELOAD_WORDS,
  SHOULDER_WORDS,
  SIDE_WORDS,
  TAPER_GIVEN_WORDS,
  TAPER_METHOD_WORDS,
} from './words';

export interface Difference {
  path: string;
  label: string;
  mine: string;
  theirs: string;
}

const ANSWERS: { path: string; label: string; words?: Record<string, string> }[] = [
  { path: 'operation', label: 'Operation', words: OPERATION_WORDS },
  { path: 'work.material', label: 'Material', words: MATERIAL_WORDS },
  { path: 'work.holding', label: 'Holding', words: HOLDING_WORDS },
  { path: 'work.preload', label: 'Preload', words: PRELOAD_WORDS },
  { path: 'work.taperSide', label: 'Side of the taper', words: SIDE_WORDS },
  { path: 'work.taperMethod', label: 'Taper made with', words: TAPER_METHOD_WORDS },
  { path: 'work.taperGiven', label: 'Taper given by', words: TAPER_GIVEN_WORDS },
  { path: 'work.shoulders', label: 'Shoulders', words: SHOULDER_WORDS },
  { path: 'work.interrupted', label: 'Interrupted surface' },
  { path: 'work.throughBore', label: 'Through bore' },
  { path: 'machine.latheId', label: 'Lathe' },
  { path: 'machine.grinderId', label: 'Grinder' },
  { path: 'machine.quillId', label: 'Quill' },
  { path: 'machine.beltStepId', label: 'Belt step' },
  { path: 'machine.shieldFitted', label: 'Shield' },
  { path: 'machine.workRotation', label: 'Direction of the work' },
  { path: 'wheel.wheelId', label: 'Wheel from the Rack' },
  { path: 'wheel.typed.marking', label: 'Marking' },
  { path: 'wheel.typed.looked', label: 'Look' },
  { path: 'wheel.typed.rung', label: 'Ring test' },
  { path: 'cut.latheRpm', label: 'Lathe step' },
  { path: 'cut.strokes', label: 'Strokes of a pass' },
];

/** Where two versions of a setup part company, in words a person can compare. */
export function differences(mine: SetupValues, theirs: SetupValues): Difference[] {
  const rows: Difference[] = [];
  if (mine.name !== theirs.name)
    rows.push({ path: 'name', label: 'Name', mine: mine.name, theirs: theirs.name });
  for (const { path, label, words } of ANSWERS) {
    const own: unknown = getIn(mine.inputs, path);
    const other: unknown = getIn(theirs.inputs, path);
    if ((own ?? null) === (other ?? null)) continue;
    rows.push({ path, label, mine: answerWords(own, words), theirs: answerWords(other, words) });
  }
  for (const path of Object.keys(QUANTITY_FIELDS) as QuantityPath[]) {
    const own = textOf(mine, path);
    const other = textOf(theirs, path);
    if (own === other) continue;
    const { label } = quantityField(path, mine.inputs.operation);
    rows.push({ path, label, mine: own || 'empty', theirs: other || 'empty' });
  }
  return rows;
}

const IS_ID = /^[0-9a-f]{8}-[0-9a-f-]{27}$/;

function answerWords(value: unknown, words?: Record<string, string>): string {
  if (value === null || value === undefined) return 'empty';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  const text = String(value);
  // Records are named by their ids here; that they differ is what matters.
  if (IS_ID.test(text)) return 'another choice';
  return words?.[text] ?? text;
}
