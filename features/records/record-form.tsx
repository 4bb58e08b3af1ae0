import {
  Formik,
  getIn,
  setIn,
  yupToFormErrors,
  type FormikErrors,
  type FormikValues,
} from 'formik';
import type { Href } from 'expo-router';
import { useRef, useState, type ReactNode } from 'react';
import { ValidationError, type AnySchema } from 'yup';

import {
  draftKey,
  fieldErrorsOf,
  FormErrors,
  FormProblem,
  readDraft,
  removeDraft,
} from '@/features/forms';
import { useShop } from '@/features/session';
import { isRefusal, problemOf } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { FieldScopeProvider } from '@/features/ui/field-ids';
import { Notice } from '@/features/ui/notice';
import { Screen } from '@/features/ui/screen';
import { Segmented } from '@/features/ui/segmented';
import { useLayout } from '@/features/ui/use-layout';
import type { UnitSystem } from '@/shared/domain/people';

import { ConflictSheet } from './conflict-sheet';
import type { Part } from './parts';
import { SaveStrip, type Keeper } from './save-strip';

export interface RecordValues {
  /** Made with the form, so that sending a new record twice makes one. */
  id: string;
  units: UnitSystem;
}

export interface Stored<Values> {
  values: Values;
  version: number;
}

/** What a form starts from; no version is a record that the server has not seen. */
export interface Start<Values> {
  values: Values;
  version: number | null;
}

interface RecordFormProps<Values extends RecordValues, Item> {
  title: string;
  /** Where "back" leads; without it `actions` hold the way out. */
  backTo?: Href;
  actions?: ReactNode;
  /** "wheel", "lathe": names the record in the words around the form. */
  noun: string;
  /** Tells this form's local draft from others of the shop: "wheel:new". */
  subject: string;
  start: Start<Values>;
  isValues: (value: unknown) => value is Values;
  schema: (values: Values) => AnySchema;
  /** Left out by forms without quantities. */
  inUnits?: (values: Values, units: UnitSystem) => Values;
  /** The facts of two versions, to be compared. */
  parts: (versions: readonly Values[]) => Part<Values>[];
  save: (values: Values, version: number | null) => Promise<Item>;
  /** The server's version as this form shows it; null when the answer is of another shape. */
  stored: (current: unknown, units: UnitSystem) => Stored<Values> | null;
  /** Fetches what an earlier, unanswered attempt to create has stored. */
  fetchCurrent: (id: string) => Promise<unknown>;
  onSaved: (item: Item) => void;
  /** What follows from the values: beside the fields on a wide screen, over them on a phone. */
  pane?: (values: Values) => ReactNode;
  children: (values: Values) => ReactNode;
}

/**
 * The form of a record: kept on the device while typing, checked on submit, with the server's own errors on their
 * fields and both versions to choose from where somebody else saved first.
 */
export function RecordForm<Values extends RecordValues & FormikValues, Item>(
  props: RecordFormProps<Values, Item>,
) {
  const { person, shop } = useShop();
  const key = draftKey(person.personId, shop.id, props.subject);
  const [round, setRound] = useState(0);
  return (
    <FieldScopeProvider scope={props.noun}>
      <KeptForm
        key={`${key}:${round}`}
        {...props}
        draftKey={key}
        onDiscard={() => {
          removeDraft(key);
          setRound(round + 1);
        }}
      />
    </FieldScopeProvider>
  );
}

/** The server counts in its own shape: what the form holds flat stands under `data` there. */
const formPath = (path: string) => path.replace(/(^|\.)data\./g, '$1');

const unchanged = <Values,>(values: Values): Values => values;

const UNIT_OPTIONS = [
  { value: 'mm', label: 'mm' },
  { value: 'inch', label: 'inch' },
] as const;

interface Refused<Values> {
  values: Values;
  errors: Record<string, string>;
}

function KeptForm<Values extends RecordValues & FormikValues, Item>({
  draftKey: key,
  onDiscard,
  ...props
}: RecordFormProps<Values, Item> & { draftKey: string; onDiscard: () => void }) {
  const { shop, units, setUnits } = useShop();
  const { wide } = useLayout();
  const inUnits = props.inUnits ?? unchanged;
  // The record may be fetched anew while it is edited; the form stands on what it started from.
  const [start] = useState(props.start);
  const [draft] = useState(() => readDraft(key, props.isValues));
  const [initialValues] = useState(() => inUnits(draft ? draft.values : start.values, units));
  const [version, setVersion] = useState(draft ? draft.version : start.version);
  const [problem, setProblem] = useState<unknown>(null);
  const [theirs, setTheirs] = useState<Stored<Values> | null>(null);
  const refused = useRef<Refused<Values> | null>(null);
  const base = version === start.version ? inUnits(start.values, units) : null;
  const keeper = useRef<Keeper>(null);

  /** The server's word on a field holds until that field is changed. */
  const withRefused = (values: Values, errors: FormikErrors<Values>) =>
    Object.entries(refused.current?.errors ?? {}).reduce(
      (tree, [path, message]) =>
        getIn(values, path) === getIn(refused.current?.values, path) && !getIn(tree, path)
          ? (setIn(tree, path, message) as FormikErrors<Values>)
          : tree,
      errors,
    );

  const validate = async (values: Values) => {
    try {
      await props.schema(values).validate(values, { abortEarly: false, context: values });
      return withRefused(values, {});
    } catch (error) {
      if (!(error instanceof ValidationError)) throw error;
      return withRefused(values, yupToFormErrors<Values>(error));
    }
  };

  const currentOf = async (error: unknown, id: string): Promise<Stored<Values> | null> => {
    const failure = problemOf(error);
    if (isRefusal(error, 'stale-version') && failure.kind === 'refused')
      return props.stored(failure.details.current, units);
    if (isRefusal(error, 'id-reused'))
      return props.stored(await props.fetchCurrent(id).catch(() => null), units);
    return null;
  };

  const send = async (
    values: Values,
    over: number | null,
    setErrors: (errors: FormikErrors<Values>) => void,
  ) => {
    setProblem(null);
    refused.current = null;
    try {
      const item = await props.save(values, over);
      keeper.current?.forget();
      props.onSaved(item);
    } catch (error) {
      const current = await currentOf(error, values.id);
      setTheirs(current);
      const fields = fieldErrorsOf(error, formPath);
      if (!current && !fields) setProblem(error);
      if (fields) {
        refused.current = { values, errors: fields };
        setErrors(withRefused(values, {}));
      }
    }
  };

  return (
    <Formik<Values>
      initialValues={initialValues}
      validate={validate}
      validateOnChange={false}
      onSubmit={(values, { setErrors }) => send(values, version, setErrors)}
    >
      {({ values, dirty, setValues, setErrors, submitForm, isSubmitting }) => (
        <Screen
          title={props.title}
          over={shop.name}
          backTo={props.backTo}
          actions={props.actions}
          width="form"
          pane={wide ? props.pane?.(values) : undefined}
          strip={
            <SaveStrip
              label={`Save the ${props.noun}`}
              busy={isSubmitting}
              draftKey={key}
              draft={{ values, version }}
              changed={dirty || draft !== null}
              keeper={keeper}
              onSave={() => {
                refused.current = null;
                void submitForm();
              }}
            />
          }
        >
          {draft ? (
            <Notice action={<Button label="Discard them" kind="quiet" onPress={onDiscard} />}>
              Your entries from before, kept on this device and not saved yet.
            </Notice>
          ) : null}
          <FormErrors />
          <FormProblem error={problem} />
          {props.inUnits ? (
            <Segmented
              name="units"
              label="Units"
              value={values.units}
              options={UNIT_OPTIONS}
              onChange={(next) => {
                setUnits(next);
                void setValues(inUnits(values, next), false);
              }}
            />
          ) : null}
          {wide ? null : props.pane?.(values)}
          {props.children(values)}
          {theirs ? (
            <ConflictSheet
              subject={`this ${props.noun}`}
              parts={props.parts([values, theirs.values])}
              versions={{ base, mine: values, theirs: theirs.values }}
              onClose={() => setTheirs(null)}
              onSave={(merged) => {
                setTheirs(null);
                setVersion(theirs.version);
                void setValues(merged, false);
                void send(merged, theirs.version, setErrors);
              }}
            />
          ) : null}
        </Screen>
      )}
    </Formik>
  );
}
